import type { EstimateSettings } from '#shared/estimates/settings';
import type { ClientContent } from '#shared/jobs/client-schema';
import type { JobContent } from '#shared/jobs/job-schema';
import type { MemberEntry } from './entries/member-entry';

/** A piece with its members, in working order. */
export interface DemonstrationPiece {
  readonly id: string;
  readonly name: string;
  readonly note: string;
  readonly members: readonly MemberEntry[];
}

/** A job of the demonstration workshop with one estimate, as its people would enter it; clients and jobs are invented. */
export interface DemonstrationJob {
  readonly client: ClientContent;
  readonly job: Omit<JobContent, 'clientId'>;
  readonly title: string;
  readonly pieces: readonly DemonstrationPiece[];
  /** What is changed in the settings an estimate begins with. */
  readonly settings: Partial<EstimateSettings>;
  readonly issueNote: string;
  /** Where its issue A stands. */
  readonly stands: 'issued' | 'sent' | 'accepted';
  /** What its client asked on their page, and what was answered; an empty answer waits. */
  readonly thread: readonly { readonly question: string; readonly answer: string }[];
  /** Members as the draft has them since issue A went out. */
  readonly changedSince: readonly MemberEntry[];
}
