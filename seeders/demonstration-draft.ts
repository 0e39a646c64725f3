import type { Draft } from '#shared/estimates/draft';
import { draftInOrder, type Kept } from '#shared/estimates/draft-in-order';
import type { MemberContent, PieceContent } from '#shared/estimates/member';
import { startSettings } from '#shared/estimates/start-settings';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { DemonstrationJob } from './demonstration-job';

/** The pieces of a job as they are kept. */
export const keptPieces = ({ pieces }: DemonstrationJob): Kept<PieceContent>[] =>
  pieces.map(({ id, name, note }, place) => ({ id, content: { name, place, note } }));

/** The members of a job as they are kept, each in its place. */
export const keptMembers = ({ pieces }: DemonstrationJob): Kept<MemberContent>[] =>
  pieces.flatMap(({ id: pieceId, members }) =>
    members.map(({ id, content }, place) => ({ id, content: { ...content, pieceId, place } })),
  );

/** What an estimate begins with, with what a job changes. */
export const settingsOfJob = (job: DemonstrationJob, begun: EstimateSettings): EstimateSettings => ({
  ...begun,
  ...job.settings,
});

/** The draft of a job on a card, without a database. */
export function demonstrationDraft(job: DemonstrationJob, card: RateCard): Draft {
  const { title } = job;
  const begun = startSettings(card, { title, seed: 1, restoration: job.job.kind === 'restoration', stageIds: [] });
  return draftInOrder(settingsOfJob(job, begun), keptPieces(job), keptMembers(job));
}
