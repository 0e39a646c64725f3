import type { Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { equilibriumMoisture } from '#shared/drying/equilibrium-moisture';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** A width of wood across the grain between two airs. `coefficient` is CR or CT of the timber; a gessoed joint across it is warned of. */
export interface MovingWidth {
  readonly width_mm: number;
  readonly coefficient: number;
  readonly from: Climate;
  readonly to: Climate;
  readonly isGessoedJoint: boolean;
}

/** Change of width in mm (negative when it shrinks), with the moisture in % it goes between. */
export interface WoodMovement {
  readonly movement_mm: number;
  readonly width_mm: number;
  readonly from_percent: number;
  readonly to_percent: number;
  readonly findings: readonly Finding[];
  readonly reasons: readonly Reason[];
}

/** Δwidth = width × C × change of moisture in points (Wood Handbook ch. 13); mm. RangeError for a negative width. */
export function widthChange_mm(width_mm: number, coefficient: number, moisture_points: number): number {
  if (!(width_mm >= 0)) throw new RangeError('a width is never negative');
  return width_mm * coefficient * moisture_points;
}

const moistureReason = (climate: Climate, moisture_percent: number): Reason => ({
  code: 'drying-moisture',
  values: { ...climate, moisture_percent },
  figure: moisture_percent,
  unit: 'percent',
});

function warnings(
  moving: MovingWidth,
  moved: { movement_mm: number; from_percent: number; to_percent: number },
  card: DryingCard,
): Finding[] {
  const findings: Finding[] = [];
  const apart = Math.abs(moved.to_percent - moved.from_percent);
  if (apart > card.moistureWarning_points) {
    const values = {
      shop_percent: moved.from_percent,
      site_percent: moved.to_percent,
      limit: card.moistureWarning_points,
    };
    findings.push({ kind: 'warn', code: 'drying-moisture-apart', values });
  }
  const movement_mm = Math.abs(moved.movement_mm);
  if (moving.isGessoedJoint && movement_mm > card.jointWarning_mm) {
    findings.push({
      kind: 'warn',
      code: 'drying-joint-moves',
      values: { width_mm: moving.width_mm, movement_mm, limit_mm: card.jointWarning_mm },
    });
  }
  return findings;
}

/** How a width moves between the air of shop and site, in mm; warns where the two differ by too much, or a gessoed joint would crack. */
export function woodMovement(moving: MovingWidth, card: DryingCard): WoodMovement {
  const from_percent = equilibriumMoisture(moving.from);
  const to_percent = equilibriumMoisture(moving.to);
  const points = to_percent - from_percent;
  const movement_mm = widthChange_mm(moving.width_mm, moving.coefficient, points);
  const values = { width_mm: moving.width_mm, coefficient: moving.coefficient, points };
  const reason: Reason = { code: 'drying-movement', values, figure: movement_mm, unit: 'mm' };
  return {
    movement_mm,
    width_mm: moving.width_mm + movement_mm,
    from_percent,
    to_percent,
    findings: warnings(moving, { movement_mm, from_percent, to_percent }, card),
    reasons: [moistureReason(moving.from, from_percent), moistureReason(moving.to, to_percent), reason],
  };
}
