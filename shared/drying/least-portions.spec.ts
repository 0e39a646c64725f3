import { leastPortions } from '#shared/drying/least-portions';
import type { SequenceStep } from '#shared/drying/sequence-step';

const time = { day_minutes: 480, days: 5, productiveShare_percent: 100 };
const day = 1440;

const step = (handsOn_minutes: number, given: Partial<SequenceStep> = {}): SequenceStep => ({
  stepId: 'step',
  kind: 'gesso',
  name: 'Step',
  gradeId: 'gilder',
  coats: 1,
  handsOn_minutes,
  betweenCoats_minutes: 0,
  latestCoat_minutes: null,
  opens_minutes: 0,
  closes_minutes: null,
  endsInWindow: false,
  wholeWithin_minutes: null,
  lags: [],
  holds: [],
  missed: null,
  factor: 1,
  isClipped: false,
  reasons: [],
  ...given,
});

const within = (toStepId: string, finishedWithin_minutes: number) => ({
  lags: [{ toStepId, least_minutes: null, finishedWithin_minutes }],
});

describe('The fewest portions worth trying', () => {
  it.each([
    ['one, where nothing has to be finished in time', [step(5_000)], 1],
    ['one, where two days of work fit into two days', [step(960, { wholeWithin_minutes: 2 * day })], 1],
    ['two, where a minute more has to', [step(961, { wholeWithin_minutes: 2 * day })], 2],
    [
      'counted over all steps up to the one that has to be finished',
      [step(900, within('last', day)), step(30), step(120, { stepId: 'last' })],
      3,
    ],
    [
      'counted on what follows a window, where it has to end inside it',
      [step(60, { opens_minutes: 60, closes_minutes: 120, endsInWindow: true }), step(180)],
      3,
    ],
    ['one, where work may only have to start inside a window', [step(60, { closes_minutes: 120 }), step(180)], 1],
  ])('%s', (_sentence, steps, portions) => {
    expect(leastPortions(steps, time)).toBe(portions);
  });

  it('counts the productive share of the day alone', () => {
    const ground = step(900, { wholeWithin_minutes: 2 * day });
    expect(leastPortions([ground], { ...time, productiveShare_percent: 85 })).toBe(2);
  });
});
