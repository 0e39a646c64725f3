import type { Actor } from '#shared/actor/actor';
import type { Change } from '#shared/estimates/change-schema';
import type { WordCode } from '#shared/words/word-code';
import type { AuditService } from '../audit';
import type { PlannedChange } from './change-plan';
import type { MemberContentRow, PieceContentRow } from './content-model';
import type { ContentRepository } from './content-repository';
import type { EstimateRow } from './estimate-model';

interface Parts {
  readonly pieces: ContentRepository<PieceContentRow>;
  readonly members: ContentRepository<MemberContentRow>;
  readonly audit: AuditService;
}

/** Pieces come before the members that stand in them, and go after. */
const order = ({ change }: PlannedChange): number => {
  if (change.kind === 'piece') return change.content ? 0 : 2;
  return 1;
};

const codes = {
  member: { made: 'history-member-made', changed: 'history-member-changed', removed: 'history-member-removed' },
  piece: { made: 'history-piece-made', changed: 'history-piece-changed', removed: 'history-piece-removed' },
  settings: {
    made: 'history-settings-changed',
    changed: 'history-settings-changed',
    removed: 'history-settings-changed',
  },
} as const satisfies Record<Change['kind'], Record<string, WordCode>>;

function deedOf({ change, before }: PlannedChange): 'made' | 'changed' | 'removed' {
  if (change.content === null) return 'removed';
  return before === null ? 'made' : 'changed';
}

const nameOf = (content: unknown): string => {
  const named = content as { name?: string; title?: string } | null;
  return named?.name ?? named?.title ?? '';
};

/** Keeps planned changes row by row, and writes the history of each. */
export class ChangeService {
  constructor(private readonly parts: Parts) {}

  async apply(actor: Actor, estimate: EstimateRow, plan: readonly PlannedChange[]): Promise<void> {
    for (const planned of plan.toSorted((one, other) => order(one) - order(other))) {
      await this.keep(estimate, planned);
      await this.record(actor, estimate, planned);
    }
  }

  private async keep(estimate: EstimateRow, { change, before, nextVersion }: PlannedChange): Promise<void> {
    const { workshopId, id: estimateId } = estimate;
    if (change.kind === 'settings') return;
    if (change.content === null) {
      await this.parts[change.kind === 'piece' ? 'pieces' : 'members'].remove(workshopId, change.id);
      return;
    }
    const row = { id: change.id, estimateId, version: nextVersion };
    if (change.kind === 'piece') {
      const whole = { ...row, content: change.content };
      await (before === null
        ? this.parts.pieces.insert(workshopId, whole)
        : this.parts.pieces.write(workshopId, change.id, whole));
    } else {
      const whole = { ...row, content: change.content, pieceId: change.content.pieceId };
      await (before === null
        ? this.parts.members.insert(workshopId, whole)
        : this.parts.members.write(workshopId, change.id, whole));
    }
  }

  private record(actor: Actor, estimate: EstimateRow, planned: PlannedChange): Promise<void> {
    const { change, before } = planned;
    const deed = deedOf(planned);
    return this.parts.audit.record(actor, {
      subject: { kind: change.kind, id: change.id },
      jobId: estimate.jobId,
      code: codes[change.kind][deed],
      values: { name: nameOf(change.content ?? before) },
      before,
      after: change.content,
      merges: deed === 'changed',
    });
  }
}
