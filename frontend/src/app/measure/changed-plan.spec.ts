import type { MouldingPlan } from '#shared/measure/moulding-shape';
import { changedPlan } from './changed-plan';

const straight = (sides_mm: number[], returns_mm: number[] = []): MouldingPlan => ({
  form: 'straight',
  sides_mm,
  returns_mm,
});

describe('Another form of plan in the place of one', () => {
  it('keeps one length with its returns as three sides at square corners', () => {
    expect(changedPlan(straight([1200], [300, 350]), 'polygon', 'mm')).toEqual({
      form: 'polygon',
      sides_mm: [300, 1200, 350],
      turns_degrees: [90, 90],
      closed: false,
    });
  });

  it('keeps several lengths as the sides of a plan that closes', () => {
    expect(changedPlan(straight([900, 400, 900, 400]), 'polygon', 'mm')).toEqual({
      form: 'polygon',
      sides_mm: [900, 400, 900, 400],
      turns_degrees: [90, 90, 90, 90],
      closed: true,
    });
    expect(changedPlan(straight([900]), 'polygon', 'mm')).toMatchObject({
      sides_mm: [900],
      turns_degrees: [],
      closed: false,
    });
  });

  it('keeps the sides of a polygon as lengths, and its first two as an oval', () => {
    const polygon = changedPlan(straight([900, 400, 900, 400]), 'polygon', 'mm');
    expect(changedPlan(polygon, 'straight', 'mm')).toEqual(straight([900, 400, 900, 400]));
    expect(changedPlan(polygon, 'ellipse', 'mm')).toEqual({ form: 'ellipse', length_mm: 900, width_mm: 400 });
  });

  it('begins a sweep anew, since no length says how it bends', () => {
    expect(changedPlan(straight([900]), 'arc', 'mm')).toEqual({ form: 'arc', radius_mm: 600, angle_degrees: 90 });
  });
});
