import type { SequenceStep } from '#shared/drying/sequence-step';
import { lotRibbon } from './lot-ribbon';
import { closedBars, holdRow, ribbonRow, ribbonTicks } from './ribbon-row';
import type { WorkedLot, WorkedTask } from './worked-lot';
import { closedTimes, workingParts } from './working-parts';

const hour = 60;
const day = 1440;
/** Eight hours on five days. */
const time = { day_minutes: 8 * hour, days: 5, productiveShare_percent: 100 };

const step = (stepId: string, given: Partial<SequenceStep> = {}): SequenceStep => ({
  ...{ stepId, kind: 'gesso', name: stepId, gradeId: 'gilder', coats: 1, handsOn_minutes: hour },
  ...{ betweenCoats_minutes: 0, latestCoat_minutes: null, opens_minutes: 0, closes_minutes: null },
  ...{ endsInWindow: false, wholeWithin_minutes: null, lags: [], holds: [], missed: null },
  ...{ factor: 1, isClipped: false, reasons: [] },
  ...given,
});
const task = (stepId: string, start_minutes: number, given: Partial<WorkedTask> = {}): WorkedTask => ({
  ...{ stepId, coat: 1, portion: 1, start_minutes, end_minutes: start_minutes + hour },
  ...given,
});
const lot = (steps: readonly SequenceStep[], tasks: readonly WorkedTask[]): WorkedLot => ({
  ...{ lotId: 'lot', name: 'Lot', steps, tasks, start_minutes: 0, end_minutes: 0 },
  ...{ handsOn_minutes: 0, drying_minutes: 0, waiting_minutes: 0 },
});

describe('The working week', () => {
  it('cuts work at the evening and leaves the weekend out', () => {
    // From an hour before the end of Friday to an hour into Monday.
    expect(workingParts({ from_minutes: 4 * day + 7 * hour, to_minutes: 7 * day + hour }, time)).toEqual([
      { from_minutes: 4 * day + 7 * hour, to_minutes: 4 * day + 8 * hour },
      { from_minutes: 7 * day, to_minutes: 7 * day + hour },
    ]);
  });

  it('is closed at night, and from Friday evening to Monday without a break', () => {
    const closed = closedTimes(7 * day, time);
    expect(closed).toHaveLength(5);
    expect(closed.at(-1)).toEqual({ from_minutes: 4 * day + 8 * hour, to_minutes: 7 * day });
  });
});

describe('lotRibbon', () => {
  it('dries between coats and after the last one, and names a step once', () => {
    const gesso = step('Gesso', { coats: 2, betweenCoats_minutes: 30, opens_minutes: day });
    const ribbon = lotRibbon(lot([gesso], [task('Gesso', 0), task('Gesso', 90, { coat: 2 })]), time);
    expect(ribbon.drying).toEqual([
      { from_minutes: 60, to_minutes: 90 },
      { from_minutes: 150, to_minutes: 150 + day },
    ]);
    expect(ribbon.work.map(({ label }) => label)).toEqual(['Gesso', '']);
  });

  it('outlines from when the size takes leaf to when it no longer does', () => {
    const size = step('Oil size', { opens_minutes: 3 * hour, closes_minutes: 6 * hour });
    const ribbon = lotRibbon(lot([size, step('Lay')], [task('Oil size', 0), task('Lay', 4 * hour)]), time);
    expect(ribbon.windows).toEqual([{ from_minutes: 4 * hour, to_minutes: 7 * hour, label: 'Oil size' }]);
  });

  it('outlines burnishing from when the leaf has dried to a day after laying began, in every portion', () => {
    const lay = step('Lay', { lags: [{ toStepId: 'Burnish', least_minutes: null, finishedWithin_minutes: day }] });
    const second = step('Second laying', { opens_minutes: 4 * hour });
    const tasks = [1, 2].flatMap((portion) => {
      const from = (portion - 1) * day;
      return [
        task('Lay', from, { portion }),
        task('Second laying', from + hour, { portion }),
        task('Burnish', from + 6 * hour, { portion }),
      ];
    });
    expect(lotRibbon(lot([lay, second, step('Burnish')], tasks), time).windows).toEqual([
      { from_minutes: 6 * hour, to_minutes: day, label: 'Burnish' },
      { from_minutes: day + 6 * hour, to_minutes: 2 * day, label: 'Burnish' },
    ]);
  });
});

describe('The ribbon as it is drawn', () => {
  const work = [0, 1, 2, 3].map((index) => ({
    from_minutes: index * hour,
    to_minutes: index * hour + 30,
    label: 'Gesso',
  }));

  it('names only what there is room for, and keeps the shortest work visible', () => {
    const row = ribbonRow({ work, drying: [], windows: [] }, { day_px: 24, width_px: 240 });
    expect(row.labels).toEqual([{ x: 0, text: 'Gesso' }]);
    expect(row.work.map(({ width }) => width)).toEqual([1.5, 1.5, 1.5, 1.5]);
    expect(ribbonRow({ work, drying: [], windows: [] }, { day_px: 2400, width_px: 9600 }).labels).toHaveLength(4);
  });

  it('sets a name back that would be cut off at the right edge', () => {
    const late = [{ from_minutes: 9 * day, to_minutes: 9 * day + hour, label: 'Second laying' }];
    const { labels } = ribbonRow({ work: late, drying: [], windows: [] }, { day_px: 24, width_px: 240 });
    // Thirteen letters of 7 px end at 240 px.
    expect(labels).toEqual([{ x: 149, text: 'Second laying' }]);
  });

  it('draws a wait for somebody from when they are asked until they have usually answered', () => {
    const wait = { hold: 'carving-approved', usual_days: 2, waiting: [] } as const;
    const row = holdRow([{ ...wait, from_minutes: day, to_minutes: 3 * day }], { day_px: 24, width_px: 240 });
    expect(row.holds).toEqual([{ x: 24, width: 48 }]);
  });

  it('numbers every day where it can, else the first of each week', () => {
    expect(ribbonTicks(15, 100).map(({ day: number }) => number)).toEqual(
      Array.from({ length: 15 }, (_, at) => at + 1),
    );
    expect(ribbonTicks(20, 20).map(({ day: number }) => number)).toEqual([1, 8, 15]);
  });

  it('leaves nights out where they would only be stripes', () => {
    expect(closedBars(7, time, 100)).toHaveLength(5);
    expect(closedBars(7, time, 12)).toHaveLength(1);
  });
});
