import { benchDayOf, benchTaskOf, type BenchJob } from '#shared/programme/bench-day-of';
import { programmeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask } from '#shared/programme/programme-plan';
import { lagForSpecs } from '#shared/programme/request-for-specs';

const frame = programmeFrame('2027-01-04', 'UTC');
const at = (day: number, hour: number) => day * 1440 + hour * 60;

const planned = (taskId: string, start_minutes: number, end_minutes: number, personIds = ['gina']): PlannedTask => ({
  ...{ taskId, start_minutes, end_minutes, personIds, spans: [{ start_minutes, end_minutes }] },
  ...{ dryUntil_minutes: null, windowUntil_minutes: null, slack_minutes: 0, isCritical: false, waits: [] },
});

const item = (taskId: string, more: Partial<ProgrammeItem> = {}): ProgrammeItem => ({
  ...{
    taskId,
    lotId: 'lot',
    lot: 'Oil gilding',
    pieceId: 'piece',
    piece: 'Table',
    memberIds: [],
    stepId: taskId,
    name: taskId,
  },
  ...{
    kind: 'oil-size',
    coat: 1,
    coats: 1,
    portion: 1,
    portions: 1,
    gradeId: 'gilder',
    grade: 'Gilder',
    handsOn_minutes: 60,
  },
  ...more,
});

/** Size at nine, to be laid between noon and three and done by then; a tone two days later by somebody else. */
const job = (more: Partial<BenchJob> = {}): BenchJob => ({
  ...{ estimateId: 'estimate', number: '2027-001', title: 'Table', placeHolds: [], approvals: [], marks: [] },
  ...{ revision: 0, keptAt: null },
  paces: [{ id: 'oil', stretches: [{ from_minutes: 0, factor: 1.5 }] }],
  items: [item('size'), item('lay'), item('tone')],
  lags: [
    lagForSpecs('size', 'lay', { id: 'tack', least: 120, paceId: 'oil' }),
    lagForSpecs('size', 'lay', { id: 'window', toPoint: 'end', most: 240, paceId: 'oil' }),
    lagForSpecs('lay', 'tone', { id: 'rest', least: 2880 }),
  ],
  plan: {
    ...{
      status: 'feasible',
      from_minutes: 0,
      start_minutes: at(0, 8),
      finish_minutes: at(2, 15),
      lowerBound_minutes: 0,
      gap: 0,
      plans: 1,
      findings: [],
      cycle: [],
    },
    tasks: [
      planned('size', at(0, 8), at(0, 9)),
      planned('lay', at(0, 12), at(0, 14)),
      planned('tone', at(2, 14), at(2, 15), ['tom']),
    ],
  },
  ...more,
});

const asked = (more: Partial<Parameters<typeof benchDayOf>[1]> = {}) => ({
  ...{ personId: 'gina', day: '2027-01-04', now_minutes: at(0, 8), frame, nameOf: (id: string) => id },
  ...more,
});
const mark = (taskId: string, start_minutes: number, end_minutes: number | null) => ({
  ...{ taskId, left_minutes: 0, leftAt: '2027-01-04T00:00:00.000Z', personIds: ['gina'] },
  startedAt: new Date(Date.UTC(2027, 0, 4) + start_minutes * 60_000).toISOString(),
  endedAt: end_minutes === null ? null : new Date(Date.UTC(2027, 0, 4) + end_minutes * 60_000).toISOString(),
});
const lay = (one: BenchJob, more: Partial<Parameters<typeof benchDayOf>[1]> = {}) =>
  benchTaskOf(one, 'lay', asked(more));

describe('The day at the bench', () => {
  it('lists what one person does, in order, and nobody else’s', () => {
    expect(benchDayOf([job()], asked()).tasks.map(({ taskId }) => taskId)).toEqual(['size', 'lay']);
    expect(benchDayOf([job()], asked({ personId: 'tom' })).tasks).toEqual([]);
    expect(
      benchDayOf([job()], asked({ personId: 'tom', day: '2027-01-06' })).tasks.map(({ taskId }) => taskId),
    ).toEqual(['tone']);
  });

  it('names the next day after it with work for them, where there is one', () => {
    expect(benchDayOf([job()], asked({ personId: 'tom' })).nextDay).toBe('2027-01-06');
    expect(benchDayOf([job()], asked({ personId: 'tom', day: '2027-01-06' })).nextDay).toBeNull();
    expect(benchDayOf([job()], asked()).nextDay).toBeNull();
    expect(benchDayOf([job()], asked({ personId: null })).nextDay).toBe('2027-01-06');
  });

  it('tells when the coat below is dry and when its window closes, slower where the air is: 2 h × 1.5 and 4 h × 1.5 from nine', () => {
    expect(lay(job())).toMatchObject({
      readyAt: '2027-01-04T12:00:00.000Z',
      windowClosesAt: '2027-01-04T15:00:00.000Z',
      state: 'waiting',
    });
    expect(benchDayOf([job()], asked()).windowsClosing.map(({ taskId }) => taskId)).toEqual(['lay']);
  });

  it('moves both with the coat as it was really finished', () => {
    const late = job({ marks: [mark('size', at(0, 9), at(0, 10))] });
    expect(lay(late)).toMatchObject({
      readyAt: '2027-01-04T13:00:00.000Z',
      windowClosesAt: '2027-01-04T16:00:00.000Z',
    });
  });

  it('is drying until it is dry, then ready, then started, then finished', () => {
    const sized = [mark('size', at(0, 8), at(0, 9))];
    const stateAt = (now_minutes: number, marks = sized) => lay(job({ marks }), { now_minutes })?.state;
    expect(stateAt(at(0, 11))).toBe('drying');
    expect(stateAt(at(0, 12))).toBe('ready');
    expect(stateAt(at(0, 13), [...sized, mark('lay', at(0, 12), null)])).toBe('started');
    expect(stateAt(at(0, 15), [...sized, mark('lay', at(0, 12), at(0, 14))])).toBe('finished');
    const { coatsReady } = benchDayOf([job({ marks: sized })], asked({ now_minutes: at(0, 12) }));
    expect(coatsReady.map(({ taskId }) => taskId)).toEqual(['lay']);
  });

  it('waits for an approval that was not given', () => {
    const approval = {
      id: 'sample',
      name: 'Sample',
      afterTaskId: null,
      beforeTaskId: 'size',
      usual_days: 2,
      given_minutes: null,
    };
    const stateOf = (one: BenchJob) => benchTaskOf(one, 'size', asked())?.state;
    expect(stateOf(job({ approvals: [approval] }))).toBe('waiting');
    expect(stateOf(job({ approvals: [{ ...approval, given_minutes: 0 }] }))).toBe('ready');
  });

  it('carries over what was not finished on the day before', () => {
    const next = asked({ day: '2027-01-05', now_minutes: at(1, 8) });
    expect(benchDayOf([job()], next).tasks.map(({ taskId }) => taskId)).toEqual(['size', 'lay']);
    const done = [mark('size', at(0, 8), at(0, 9)), mark('lay', at(0, 12), at(0, 14))];
    expect(benchDayOf([job({ marks: done })], next).tasks).toEqual([]);
  });
});
