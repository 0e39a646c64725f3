import { cabinetStandJob } from './cabinet-stand/cabinet-stand-job';
import type { DemonstrationJob } from './demonstration-job';
import { paintedPlinthJob } from './painted-plinth/painted-plinth-job';
import { pierTableJob } from './pier-table/pier-table-job';

/** The jobs of the demonstration workshop, in the order they were opened; every call makes new ids. */
export const demonstrationJobs = (): DemonstrationJob[] => [pierTableJob(), cabinetStandJob(), paintedPlinthJob()];
