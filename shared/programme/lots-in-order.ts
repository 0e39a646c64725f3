import type { StepKind } from '#shared/buildups/buildup';
import type { PlannedLot } from '#shared/programme/planned-lot';
import type { ProgrammeLag } from '#shared/programme/programme-request';

/** The steps after which nothing of gilding in water is left to do on a member. */
const waterSteps: readonly StepKind[] = ['lay', 'fault', 'second-laying', 'burnish', 'matte-size', 'protect-edge'];

const idsOf = ({ blocks }: PlannedLot, kinds: readonly StepKind[], which: 'first' | 'last'): string[] =>
  blocks.flatMap(({ portions }) =>
    portions.flatMap((steps) =>
      steps
        .filter(({ step }) => kinds.includes(step.kind))
        .map(({ tasks }) => (which === 'first' ? tasks[0] : tasks[tasks.length - 1]).task.id),
    ),
  );

/** The last of them stand for all: what comes before in its own lot is done by then. */
function waterDone(lot: PlannedLot): string[] {
  const steps = lot.blocks
    .flatMap(({ portions }) => portions.flat())
    .filter(({ step }) => waterSteps.includes(step.kind));
  const last = steps.at(-1)?.step.stepId;
  return steps.filter(({ step }) => step.stepId === last).map(({ tasks }) => tasks[tasks.length - 1].task.id);
}

const shareMember = (one: PlannedLot, other: PlannedLot): boolean =>
  one.lot.memberIds.some((id) => other.lot.memberIds.includes(id));

/** Oily size comes near a member only when all gilding in water on it is laid, burnished and its edge protected (common practice). */
export function lotsInOrder(lots: readonly PlannedLot[]): ProgrammeLag[] {
  const water = lots.filter(({ lot }) => lot.sequence.system === 'water');
  return water.flatMap((before) =>
    lots
      .filter((after) => after !== before && shareMember(before, after))
      .flatMap((after) =>
        waterDone(before).flatMap((fromTaskId) =>
          idsOf(after, ['oil-size'], 'first').map((toTaskId): ProgrammeLag => ({
            ...{
              id: `${fromTaskId}>${toTaskId}:water-first`,
              fromTaskId,
              fromPoint: 'end',
              toTaskId,
              toPoint: 'start',
            },
            ...{ least: 0, most: null, time: 'clock', paceId: null },
          })),
        ),
      ),
  );
}
