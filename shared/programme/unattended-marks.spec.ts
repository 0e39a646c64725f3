import { programmeFrame } from '#shared/programme/programme-frame';
import type { TaskMark } from '#shared/programme/programme-inputs';
import { lagForSpecs } from '#shared/programme/request-for-specs';
import { unattendedMarks, type MarkedWork } from '#shared/programme/unattended-marks';

const frame = programmeFrame('2027-01-04', 'UTC');
const item = (taskId: string, handsOn_minutes: number) => ({ taskId, handsOn_minutes });
const mark = (taskId: string, startedAt: string, endedAt: string | null): TaskMark => ({
  ...{
    taskId,
    startedAt: `2027-01-${startedAt}:00.000Z`,
    left_minutes: 0,
    leftAt: '2027-01-04T08:00:00.000Z',
    personIds: ['carl'],
  },
  endedAt: endedAt && `2027-01-${endedAt}:00.000Z`,
});

/** Two grades carve a member, which is then carved; leaf that was laid is left alone once it is dry, and toned two days later in air half as good. */
const work = (marks: readonly TaskMark[], more: Partial<MarkedWork> = {}): MarkedWork => ({
  items: [
    item('master', 60),
    item('carver', 60),
    item('carved', 0),
    item('lay', 60),
    item('leave', 0),
    item('tone', 60),
  ],
  lags: [
    lagForSpecs('master', 'carved'),
    lagForSpecs('carver', 'carved'),
    lagForSpecs('lay', 'leave', { least: 60, paceId: 'oil' }),
    lagForSpecs('leave', 'tone', { least: 2880, paceId: 'oil' }),
  ],
  paces: [{ id: 'oil', stretches: [{ from_minutes: 0, factor: 2 }] }],
  ...{ approvals: [], marks, frame, ...more },
});
const momentOf = (asked: MarkedWork, taskId: string) =>
  unattendedMarks(asked).find((one) => one.taskId === taskId)?.endedAt;

describe('Work nobody has a hand in', () => {
  const carving = [mark('master', '04T08:00', '04T09:00'), mark('carver', '04T08:00', '05T11:30')];

  it('is over with the last of what it waits for', () => {
    expect(momentOf(work(carving), 'carved')).toBe('2027-01-05T11:30:00.000Z');
  });

  it('is not over while any of that is in work or was never begun', () => {
    const inWork = [carving[0], mark('carver', '04T08:00', null)];
    expect(unattendedMarks(work(inWork))).toEqual(inWork);
    expect(unattendedMarks(work([carving[0]]))).toEqual([carving[0]]);
    expect(unattendedMarks(work([]))).toEqual([]);
  });

  it('waits until what it follows is dry in the air there is: an hour is two', () => {
    expect(momentOf(work([mark('lay', '04T08:00', '04T09:00')]), 'leave')).toBe('2027-01-04T11:00:00.000Z');
  });

  it('waits for an approval, and no longer than it was given', () => {
    const approval = { id: 'a', name: 'Leaf', afterTaskId: null, beforeTaskId: 'leave', usual_days: 2 };
    const laid = [mark('lay', '04T08:00', '04T09:00')];
    const given = (given_minutes: number | null) => work(laid, { approvals: [{ ...approval, given_minutes }] });
    expect([momentOf(given(null), 'leave'), momentOf(given(0), 'leave')]).toEqual([
      undefined,
      '2027-01-04T11:00:00.000Z',
    ]);
  });

  it('follows other such work', () => {
    const more = {
      items: [item('leave', 0), item('again', 0), item('lay', 60)],
      lags: [lagForSpecs('leave', 'again', { least: 30 }), lagForSpecs('lay', 'leave')],
    };
    expect(momentOf(work([mark('lay', '04T08:00', '04T09:00')], more), 'again')).toBe('2027-01-04T09:30:00.000Z');
  });

  it('never replaces what was marked, nor what somebody has a hand in', () => {
    const all = [...carving, mark('carved', '06T08:00', '06T08:00')];
    expect(unattendedMarks(work(all))).toEqual(all);
    expect(momentOf(work([mark('lay', '04T08:00', '04T09:00')]), 'tone')).toBeUndefined();
  });
});
