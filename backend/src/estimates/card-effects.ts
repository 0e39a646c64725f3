import { setImmediate as letOthersIn } from 'node:timers/promises';
import type { Figures } from '#shared/estimates/figures';
import { lineDifferences, type NamedLines } from '#shared/estimates/line-differences';
import type { JobState } from '#shared/jobs/job-schema';
import type { CardEffect } from '#shared/rate-cards/card-effects';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { Rejection } from '#shared/problems/rejection';
import type { Finding } from '#shared/words/finding';
import type { Jobs, NamedJobRow } from '../jobs';
import type { CardEffects, RateCardService } from '../rate-cards';
import type { EstimateService } from './estimate-service';
import type { RiskDrawing } from './risk-drawing';
import { inputOf, type WholeEstimate } from './whole-estimate';

interface Parts {
  readonly drafts: EstimateService;
  readonly jobs: Pick<Jobs, 'service'>;
  readonly cards: RateCardService;
  readonly risks: Pick<RiskDrawing, 'priced'>;
}

/** An estimate whose price can still change: nobody has accepted or declined it. */
interface OpenEstimate {
  readonly job: NamedJobRow;
  readonly estimateId: string;
}

const openStates: readonly JobState[] = ['open', 'sent'];
const jobsAtOnce = 100;

const isGrave = ({ kind }: Finding): boolean => kind === 'missing' || kind === 'refuse';
const graveOf = ({ findings, cost }: Figures): Finding[] => [...findings, ...cost.findings].filter(isGrave);

/** What the new card lacks or forbids, and the old one did not. */
function newFindings(before: Figures, after: Figures): Finding[] {
  const known = new Set(graveOf(before).map((finding) => JSON.stringify(finding)));
  return graveOf(after).filter((finding) => !known.has(JSON.stringify(finding)));
}

interface Compared {
  readonly whole: WholeEstimate;
  readonly job: NamedJobRow;
  readonly before: Figures;
  /** None where the new card makes them too large to be worked. */
  readonly after: Figures | undefined;
}

const tooLarge: Finding = { kind: 'refuse', code: 'effect-too-large', values: {} };

/** One estimate that cannot be worked on the new card keeps nobody from reading of the others. */
async function figuresIfWorked(working: Promise<Figures>): Promise<Figures | undefined> {
  try {
    return await working;
  } catch (error) {
    if (error instanceof Rejection && error.code === 'estimate-too-large') return undefined;
    throw error;
  }
}

function effectOf({ whole, job, before, after }: Compared): CardEffect {
  const { id, number, currency, settings } = whole.estimate;
  const memberNames = Object.fromEntries(whole.members.map((member) => [member.id, member.content.name]));
  const named = ({ price: { lines } }: Figures): NamedLines => ({ lines, memberNames });
  return {
    estimateId: id,
    jobId: job.id,
    number,
    title: settings.title,
    jobTitle: job.title,
    currency,
    before_minor: before.price.net_minor,
    after_minor: (after ?? before).price.net_minor,
    lines: after ? lineDifferences(named(before), named(after)) : [],
    findings: after ? newFindings(before, after) : [tooLarge],
  };
}

async function jobsIn(state: JobState, workshopId: string, { jobs }: Parts): Promise<NamedJobRow[]> {
  const found: NamedJobRow[] = [];
  let cursor: string | undefined;
  do {
    const asked = { search: '', order: 'number', state, limit: jobsAtOnce, cursor } as const;
    const page = await jobs.service.page(workshopId, asked);
    found.push(...page.items);
    cursor = page.next ?? undefined;
  } while (cursor !== undefined);
  return found;
}

async function openEstimates(workshopId: string, parts: Parts): Promise<OpenEstimate[]> {
  const found: OpenEstimate[] = [];
  for (const state of openStates) {
    for (const job of await jobsIn(state, workshopId, parts)) {
      const rows = await parts.drafts.ofJob(workshopId, job.id);
      found.push(...rows.map((row) => ({ job, estimateId: row.id })));
    }
  }
  return found;
}

/** Works every open estimate of a workshop on its own card and on another, one after the other, letting others in between. */
export const cardEffects =
  (parts: Parts): CardEffects =>
  async ({ workshopId, content }, tell) => {
    const open = await openEstimates(workshopId, parts);
    const effects: CardEffect[] = [];
    const figuresOn = (card: RateCard, whole: WholeEstimate) => parts.risks.priced(inputOf(whole, card));
    await tell(0, open.length);
    for (const { job, estimateId } of open) {
      const whole = await parts.drafts.whole(workshopId, estimateId);
      const own = await parts.cards.card(workshopId, whole.estimate.rateCardId);
      const before = await figuresOn(own, whole);
      effects.push(effectOf({ whole, job, before, after: await figuresIfWorked(figuresOn(content, whole)) }));
      await tell(effects.length, open.length);
      await letOthersIn();
    }
    return effects;
  };
