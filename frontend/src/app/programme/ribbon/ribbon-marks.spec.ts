import { programmeFrame } from '#shared/programme/programme-frame';
import { closedStretches, ribbonMarks } from './ribbon-marks';

const frame = programmeFrame('2027-03-26', 'Europe/Dublin');
const scale = { first_minutes: 0, last_minutes: 20_160, hour_px: 10 };
const part = { left: 0, right: 1000, top: 0, bottom: 100 };

describe('The days of the ribbon', () => {
  it('stand where the clock says, over the night the clocks change', () => {
    const days = ribbonMarks(part, scale, frame).filter(({ kind }) => kind === 'day');
    const at = (day: string) => days.find((mark) => mark.day === day)?.x;
    // The clocks of Dublin go forward on 28 March 2027: that day is 23 hours long.
    expect([at('2027-03-26'), at('2027-03-28'), at('2027-03-29')]).toEqual([0, 480, 710]);
  });

  it.each([
    [10, 'day'],
    [1, 'week'],
    [0.2, 'month'],
  ] as const)('are named at %d pixels an hour by the %s', (hour_px, kind) => {
    const marks = ribbonMarks({ ...part, right: 2000 }, { ...scale, hour_px }, frame).filter(
      (one) => one.kind !== 'hour',
    );
    expect(new Set(marks.map((mark) => mark.kind))).toEqual(new Set([kind]));
  });

  it('shade nights and closed days, and no pause at noon', () => {
    const open = [
      { start_minutes: 480, end_minutes: 750 },
      { start_minutes: 780, end_minutes: 1020 },
      { start_minutes: 1920, end_minutes: 2460 },
    ];
    const closed = closedStretches(open, { part, scale: { ...scale, last_minutes: 2880, hour_px: 60 } });
    expect(closed).toEqual([{ x: 0, width: 480 }]);
    const all = closedStretches(open, {
      part: { ...part, right: 9000 },
      scale: { ...scale, last_minutes: 2880, hour_px: 60 },
    });
    expect(all).toEqual([
      { x: 0, width: 480 },
      { x: 1020, width: 900 },
      { x: 2460, width: 420 },
    ]);
  });
});
