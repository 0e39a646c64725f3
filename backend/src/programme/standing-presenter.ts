import type { ProgrammeRow } from './programme-model';
import type { ShopRow } from './shop-model';

/** The shop as it stands, beside what somebody wanted to keep on top of an older version. */
export const standingShop = ({ version, content }: ShopRow) => ({ version, content });

/** The programme as it stands, beside what somebody wanted to keep on top of an older version. */
export const standingProgramme = ({ version, inputs }: ProgrammeRow) => ({ version, inputs });
