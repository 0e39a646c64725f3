import type { MouldingPlan, MouldingShape, PolygonPlan } from '#shared/measure/moulding-shape';
import { sideTooLong } from '#shared/measure/plan-closure';
import { planRun, sidesAt } from '#shared/measure/plan-run';
import { profileComplaints } from '#shared/measure/profile-complaints';
import { profileCurve } from '#shared/measure/profile-curve';
import { profileGirth } from '#shared/measure/profile-girth';
import type { Complaint } from '#shared/problems/complaint';
import type { WordCode, WordValues } from '#shared/words/word-code';

const complaint = (field: string, code: WordCode, values: WordValues = {}): Complaint => ({
  path: ['plan', field],
  code,
  values,
});

function planComplaints(plan: MouldingPlan): Complaint[] {
  if (plan.form === 'straight') {
    const limit = 2 * plan.sides_mm.length;
    return plan.returns_mm.length > limit ? [complaint('returns_mm', 'shape-returns-many', { limit })] : [];
  }
  return plan.form === 'polygon' ? polygonComplaints(plan) : [];
}

function polygonComplaints(plan: PolygonPlan): Complaint[] {
  const needed = plan.closed ? plan.sides_mm.length : plan.sides_mm.length - 1;
  if (plan.turns_degrees.length !== needed) return [complaint('turns_degrees', 'shape-turns-count', { needed })];
  const sum = plan.turns_degrees.reduce((turned, turn) => turned + turn, 0);
  // Half a degree forgives angles read off a bevel; a plan that closes turns once round.
  if (plan.closed && Math.abs(sum - 360) > 0.5) return [complaint('turns_degrees', 'shape-turns-sum', { sum })];
  const longest_mm = plan.closed ? sideTooLong(plan.sides_mm) : undefined;
  if (longest_mm === undefined) return [];
  const others_mm = plan.sides_mm.reduce((all, side_mm) => all + side_mm, 0) - longest_mm;
  return [complaint('sides_mm', 'shape-sides-cannot-close', { longest_mm, others_mm })];
}

// The tightest curve of an oval, at the ends of its longer axis, has radius b²/a.
function tightestRadius(plan: MouldingPlan): number {
  if (plan.form !== 'ellipse') return Infinity;
  const [longer, shorter] = [Math.max(plan.length_mm, plan.width_mm) / 2, Math.min(plan.length_mm, plan.width_mm) / 2];
  return longer === 0 ? 0 : shorter ** 2 / longer;
}

// Neither the back nor the front of the profile may shrink a side or a curve to less than nothing.
function isTooTight(shape: MouldingShape): boolean {
  const { back_mm, front_mm } = profileGirth(profileCurve(shape.profile));
  const depth_mm = front_mm - back_mm;
  const offset_mm = shape.measuredAt === 'back' ? depth_mm : -depth_mm;
  const tolerance_mm = 1e-9 * (1 + depth_mm);
  const isInwards = offset_mm < 0 === (shape.facing === 'outward');
  if (isInwards && tightestRadius(shape.plan) < depth_mm - tolerance_mm) return true;
  const run = planRun(shape);
  return sidesAt(run, offset_mm).some((side_mm) => side_mm < -tolerance_mm);
}

/** What cannot be in a moulding, by the path within its shape; lengths in mm. */
export function mouldingComplaints(shape: MouldingShape): Complaint[] {
  const own = [...profileComplaints(shape.profile), ...planComplaints(shape.plan)];
  if (own.length > 0 || !isTooTight(shape)) return own;
  return [{ path: ['plan'], code: 'shape-plan-too-tight', values: {} }];
}
