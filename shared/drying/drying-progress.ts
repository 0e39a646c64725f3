import type { ClimateModel } from '#shared/buildups/buildup';
import type { Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { dryingFactor } from '#shared/drying/drying-factor';
import type { Finding } from '#shared/words/finding';

/** A stretch of time in one air. */
export interface ClimateStretch {
  readonly minutes: number;
  readonly climate: Climate;
}

/** How far something has dried: minutes it would have taken at 20 °C and 50 % RH, and what was wrong on the way. */
export interface DryingProgress {
  readonly reference_minutes: number;
  readonly findings: readonly Finding[];
}

/** ∫dt ÷ factor over stretches of air, in minutes at the reference air; a stretch in which nothing dries counts nothing and is told. RangeError for a negative stretch. */
export function dryingProgress(
  model: ClimateModel,
  stretches: readonly ClimateStretch[],
  card: DryingCard,
): DryingProgress {
  let reference_minutes = 0;
  const findings: Finding[] = [];
  for (const { minutes, climate } of stretches) {
    if (!(minutes >= 0)) throw new RangeError('a stretch of time is never negative');
    const { factor, findings: told } = dryingFactor(model, climate, card);
    if (factor !== null) reference_minutes += minutes / factor;
    findings.push(...told);
  }
  return { reference_minutes, findings };
}
