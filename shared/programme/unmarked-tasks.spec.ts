import type { PlannedTask } from '#shared/programme/programme-plan';
import { programme } from '#shared/programme/programme';
import { requestForSpecs } from '#shared/programme/request-for-specs';
import { standAsPlanned } from '#shared/programme/stand-as-planned';
import { unmarkedTasks } from '#shared/programme/unmarked-tasks';

const planned = (taskId: string, start_minutes: number, end_minutes: number, personIds = ['gina']): PlannedTask => ({
  ...{ taskId, start_minutes, end_minutes, personIds, spans: [{ start_minutes, end_minutes }] },
  ...{ dryUntil_minutes: null, windowUntil_minutes: null, slack_minutes: 0, isCritical: false, waits: [] },
});
const tasks = [planned('lay', 600, 700), planned('size', 480, 540), planned('left alone', 700, 700, [])];
const plan = { ...programme(requestForSpecs()), tasks };
const mark = (taskId: string) => ({
  ...{ taskId, startedAt: '2027-01-04T08:00:00.000Z', endedAt: null, left_minutes: 60 },
  ...{ leftAt: '2027-01-04T08:00:00.000Z', personIds: ['gina'] },
});

describe('What should have begun by now', () => {
  it('is told in order as far as nobody marked it, without what nobody has a hand in', () => {
    const at = (now_minutes: number, marks = [mark('carve')]) => unmarkedTasks({ plan, marks, now_minutes });
    expect(at(480)).toEqual([]);
    expect(at(481)).toEqual(['size']);
    expect(at(2000)).toEqual(['size', 'lay']);
    expect(at(2000, [mark('size')])).toEqual(['lay']);
  });

  it('is finished or in work, if it went as planned', () => {
    expect([480, 540, 541].map((now) => standAsPlanned(tasks[1], now))).toEqual([
      null,
      { start_minutes: 480, end_minutes: 540 },
      { start_minutes: 480, end_minutes: 540 },
    ]);
    expect(standAsPlanned(tasks[1], 500)).toEqual({ start_minutes: 480, end_minutes: null });
  });
});
