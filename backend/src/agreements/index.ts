import type { Jobs } from '../jobs';
import type { Visits } from '../platform/session/session-control';
import type { Platform } from '../platform/platform';
import { ClientAccessRepository } from './client-access-repository';
import { VisitService } from './visit-service';

export interface Agreements {
  readonly visits: Visits;
}

/** What this feature stands on. */
export interface AgreementsNeeds {
  readonly jobs: Jobs;
}

/** What a workshop and its client settle: ways in, questions, decisions, contracts and variations. */
export function openAgreements({ database, clock }: Platform, { jobs }: AgreementsNeeds): Agreements {
  const accesses = new ClientAccessRepository(database);
  return { visits: new VisitService({ accesses, jobs, clock }) };
}
