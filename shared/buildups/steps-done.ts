import type { BuildUp, BuildUpStep } from '#shared/buildups/buildup';
import type { ZoneFacts } from '#shared/buildups/zone-facts';

function isDone(step: BuildUpStep, facts: ZoneFacts): boolean {
  if (step.kind === 'recut') return facts.recutting !== null;
  if (!step.optional || facts.chosenStepIds.includes(step.id)) return true;
  return step.kind === 'seal' && facts.needsSeal;
}

/** The steps of a build-up a zone gets, in working order: optional ones where chosen, seals where the leaf needs one, recutting where asked. */
export const stepsDone = (buildUp: BuildUp, facts: ZoneFacts): BuildUpStep[] =>
  buildUp.steps.filter((step) => isDone(step, facts));
