import { cautionNames, type BuildUp, type BuildUpStep, type CautionName } from '#shared/buildups/buildup';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { Finding } from '#shared/words/finding';

/** Old coatings are touched in every step that cleans, consolidates, rubs down or cuts back. */
const disturbing = ['clean', 'consolidate', 'smooth', 'recut', 'size-coat'];

/** What is done on a zone, and whether old coatings may lie under it. */
interface Done {
  readonly buildUp: BuildUp;
  readonly steps: readonly BuildUpStep[];
  readonly isRestoration: boolean;
}

function stepNames(name: CautionName, { buildUp, steps, isRestoration }: Done): string[] {
  const touched = steps.filter(
    (step) => step.cautions.includes(name) || (name === 'lead' && isRestoration && disturbing.includes(step.kind)),
  );
  if (name === 'lead' && isRestoration && touched.length === 0) return [buildUp.name];
  return touched.map((step) => step.name);
}

function caution(name: CautionName, steps: readonly string[], facts: ZoneFacts): Finding {
  const kind = name === 'glue-heat' ? 'note' : 'caution';
  return { kind, code: `caution-${name}`, values: { steps: steps.join(', ') }, about: facts.id };
}

/** What can hurt somebody in the steps of a zone, one finding for each danger with the steps that hold it, and whom to ask; lead on any restoration. */
export function buildUpCautions(buildUp: BuildUp, facts: ZoneFacts): Finding[] {
  const done = { buildUp, steps: stepsDone(buildUp, facts), isRestoration: facts.isRestoration };
  const told = cautionNames.flatMap((name) => {
    const steps = stepNames(name, done);
    return steps.length > 0 ? [caution(name, steps, facts)] : [];
  });
  if (told.length === 0) return [];
  return [...told, { kind: 'caution', code: 'caution-defer', values: {}, about: facts.id }];
}
