import { programme } from '#shared/programme/programme';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { requestFrom } from '#shared/programme/request-from';
import { isPast, movedConsequences, pinnedRequest } from './pinned-request';

const hours = [{ start_minutes: 480, end_minutes: 1020 }];
const task = (id: string, handsOn_minutes: number) => ({
  ...{ id, name: id, lotId: 'apron', gradeId: 'gilder', handsOn_minutes, crew: 1, mostPeople: 1 },
  ...{ isBreakable: false, release_minutes: 0, pinned_minutes: null, happened: null },
});

/** Size put on, taking leaf after three hours and no longer than five; from Monday on one gilder works. */
const request: ProgrammeRequest = {
  calendar: {
    ...{ firstDay: '2027-05-03', exceptions: [], productiveShare_percent: 100, oddDays: [] },
    week: { 1: hours, 2: hours, 3: hours, 4: hours, 5: hours },
  },
  start_minutes: 0,
  tasks: [task('Size', 60), task('Lay', 60)],
  lags: [
    {
      ...{ id: 'tack', fromTaskId: 'Size', fromPoint: 'end', toTaskId: 'Lay', toPoint: 'start' },
      ...{ least: 180, most: 300, time: 'clock', paceId: null },
    },
  ],
  approvals: [],
  people: [{ id: 'imke', gradeIds: ['gilder'], week: null, exceptions: [], away: [] }],
  ...{ places: [], placeHolds: [], paces: [] },
};

describe('A task moved elsewhere', () => {
  const plan = programme(request);
  const codes = (start_minutes: number) => {
    const { impossible, follows } = movedConsequences(plan, request, { taskId: 'Lay', start_minutes });
    return [impossible, follows].map((findings) => findings.map(({ code }) => code));
  };

  it('may stand where its window is open', () => {
    expect(codes(480 + 60 + 240)).toEqual([[], []]);
  });

  it.each([
    [480 + 60 + 360, 'programme-breaks-window', 'after the window has closed'],
    [480 + 60 + 60, 'programme-breaks-lag', 'before the size has come to tack'],
    [1100, 'programme-breaks-hours', 'when nobody works'],
  ])('at minute %d breaks %s: %s', (start_minutes, code) => {
    expect(codes(start_minutes)[0]).toContain(code);
  });

  it('may not begin before the moment it is planned from, and that is all that is said of it', () => {
    const now = requestFrom(request, 480 + 60 + 250);
    const moved = movedConsequences(plan, now, { taskId: 'Lay', start_minutes: 480 + 60 + 240 });
    expect(moved.impossible.map(({ code, about }) => [code, about])).toEqual([['programme-breaks-past', 'Lay']]);
    expect(moved.follows).toEqual([]);
    expect(isPast(480 + 60 + 250, now)).toBe(false);
  });

  it('is planned round once it is pinned', () => {
    const pinned = programme(pinnedRequest(request, { taskId: 'Lay', start_minutes: 1440 + 900 }));
    const starts = Object.fromEntries(pinned.tasks.map((one) => [one.taskId, one.start_minutes]));
    expect(starts['Lay']).toBe(1440 + 900);
    expect(starts['Lay'] - (starts['Size'] + 60)).toBeGreaterThanOrEqual(180);
    expect(starts['Lay'] - (starts['Size'] + 60)).toBeLessThanOrEqual(300);
  });
});
