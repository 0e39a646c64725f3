import type { SnapshotProgramme } from '#shared/estimates/snapshot';
import type { FileStore } from '../platform/files/file-store';
import type { AgreedChoices } from './agreed-choices';
import type { ContractHolding } from './contract-holding';
import type { EstimateParts, EstimateService } from './estimate-service';
import type { IssueRepository } from './issue-repository';
import type { PaperMaker } from './paper-maker';

/** The programme of an estimate as an issue freezes it; a later feature supplies it. Null where no plan holds. */
export type FrozenProgramme = (workshopId: string, estimateId: string) => Promise<SnapshotProgramme | null>;

/** What issuing leans on. */
export interface IssueParts extends Pick<
  EstimateParts,
  'estimates' | 'cards' | 'jobs' | 'workshops' | 'audit' | 'clock'
> {
  readonly drafts: EstimateService;
  readonly issues: IssueRepository;
  readonly files: FileStore;
  readonly papers: PaperMaker;
  readonly programme: FrozenProgramme;
  readonly choices: AgreedChoices;
  readonly mustHold: ContractHolding;
}
