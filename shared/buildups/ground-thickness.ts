import type { BuildUp } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { coatsOf } from '#shared/buildups/coats-of';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** Thickness in mm of everything a build-up lays down as ground, with what has to be told about it. */
export interface GroundThickness {
  readonly thickness_mm: number;
  readonly findings: readonly Finding[];
  readonly reasons: readonly Reason[];
}

function thicknessFindings(thickness_mm: number, facts: ZoneFacts, limit_mm: number): Finding[] {
  if (thickness_mm === 0) return [];
  const allowed = { thickness_mm, socket_mm: 2 * thickness_mm };
  const joints: Finding = { kind: 'note', code: 'buildup-allow-joints', values: allowed, about: facts.id };
  const isDrowned = facts.finish === 'carved' && facts.recutting === null && thickness_mm > limit_mm + 1e-9;
  if (!isDrowned) return [joints];
  return [{ kind: 'warn', code: 'buildup-ground-thick', values: { thickness_mm, limit_mm }, about: facts.id }, joints];
}

/** Coats × thickness of a coat over all ground steps, in mm; warns above the card's limit on carving that is not recut, and tells joints and sockets. */
export function groundThickness(buildUp: BuildUp, facts: ZoneFacts, card: BuildUpCard): GroundThickness {
  const ground = stepsDone(buildUp, facts).filter((step) => step.groundPerCoat_mm > 0);
  const coats = ground.reduce((total, step) => total + coatsOf(step, facts), 0);
  const thickness_mm = ground.reduce((total, step) => total + coatsOf(step, facts) * step.groundPerCoat_mm, 0);
  const reason: Reason = {
    code: 'buildup-ground-thickness',
    values: { coats, thickness_mm },
    figure: thickness_mm,
    unit: 'mm',
    house: buildUp.name,
  };
  return { thickness_mm, findings: thicknessFindings(thickness_mm, facts, card.groundLimit_mm), reasons: [reason] };
}
