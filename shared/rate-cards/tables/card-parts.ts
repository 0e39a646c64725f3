import { buildUpsPart } from '#shared/rate-cards/tables/build-ups-part';
import type { CardPart, CardTable } from '#shared/rate-cards/tables/card-table';
import { dryingPart } from '#shared/rate-cards/tables/drying-part';
import { labourPart } from '#shared/rate-cards/tables/labour-part';
import { leafPart } from '#shared/rate-cards/tables/leaf-part';
import { lossesPart } from '#shared/rate-cards/tables/losses-part';
import { materialsPart } from '#shared/rate-cards/tables/materials-part';
import { moneyPart } from '#shared/rate-cards/tables/money-part';
import { ornamentsPart } from '#shared/rate-cards/tables/ornaments-part';
import { taxPart } from '#shared/rate-cards/tables/tax-part';
import { timberPart } from '#shared/rate-cards/tables/timber-part';

/** A rate card as it is shown and exported: its parts, their tables and every cell of them, each figure of the card exactly once. */
export const cardParts: readonly CardPart[] = [
  labourPart,
  leafPart,
  materialsPart,
  ornamentsPart,
  timberPart,
  lossesPart,
  buildUpsPart,
  dryingPart,
  moneyPart,
  taxPart,
];

/** All tables, in the order of the parts; a table stands after the one whose items it belongs to. */
export const cardTables: readonly CardTable[] = cardParts.flatMap(({ tables }) => tables);
