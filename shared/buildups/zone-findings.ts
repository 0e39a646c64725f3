import type { BuildUp } from '#shared/buildups/buildup';
import { buildUpCautions } from '#shared/buildups/buildup-cautions';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { groundThickness } from '#shared/buildups/ground-thickness';
import { sizeStrengthFindings } from '#shared/buildups/size-strength-findings';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { Finding } from '#shared/words/finding';

function outdoorsFindings(buildUp: BuildUp, facts: ZoneFacts): Finding[] {
  if (buildUp.system !== 'water' || !facts.isOutdoorsOrWet) return [];
  return [{ kind: 'refuse', code: 'buildup-water-outdoors', values: { buildup: buildUp.name }, about: facts.id }];
}

function batchFindings(buildUp: BuildUp, facts: ZoneFacts): Finding[] {
  if (!stepsDone(buildUp, facts).some((step) => step.kind === 'gesso')) return [];
  return [{ kind: 'note', code: 'buildup-one-batch', values: {}, about: facts.id }];
}

/** Everything a build-up has to tell about a zone: refusals first (weather, rising size), then the ground, then cautions. */
export function zoneFindings(buildUp: BuildUp, facts: ZoneFacts, card: BuildUpCard): Finding[] {
  return [
    ...outdoorsFindings(buildUp, facts),
    ...sizeStrengthFindings(buildUp, card),
    ...groundThickness(buildUp, facts, card).findings,
    ...batchFindings(buildUp, facts),
    ...buildUpCautions(buildUp, facts),
  ];
}
