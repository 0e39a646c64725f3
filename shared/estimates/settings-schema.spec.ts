import { settingsSchema } from '#shared/estimates/settings-schema';
import { startSettings } from '#shared/estimates/start-settings';
import { stagePayments } from '#shared/money/stage-payments';
import { startCard } from '#shared/rate-cards/start-card';

const settings = startSettings(startCard, { title: 'Base', seed: 1, restoration: false, stageIds: [] });

const stagesOf = (deposit_percent: number, percents: readonly number[], retention_percent: number) => ({
  deposit_percent,
  retention_percent,
  parts: percents.map((percent, index) => ({
    id: `018f0000-0000-7000-8000-00000000000${index}`,
    name: 'Stage',
    percent,
  })),
});

const complaints = (stages: ReturnType<typeof stagesOf>) =>
  settingsSchema
    .safeParse({ ...settings, stages })
    .error?.issues.map(({ path, message }) => [path.join('.'), message]) ?? [];

describe('settingsSchema, stages of payment', () => {
  it.each([
    ['stages of 100 % with deposit and retention', stagesOf(30, [40, 60], 5)],
    ['no stage: one payment of all', stagesOf(0, [], 0)],
    ['thirds to two decimals', stagesOf(0, [33.33, 33.33, 33.34], 0)],
    ['a tenth ten times, which floats do not add up to 1', stagesOf(0, Array<number>(10).fill(10), 0)],
    ['a deposit and a retention that are all of it', stagesOf(95, [100], 5)],
  ])('takes %s, and what it takes can be worked', (_, stages) => {
    expect(complaints(stages)).toEqual([]);
    const stages_percent = stages.parts.length > 0 ? stages.parts.map(({ percent }) => percent) : [100];
    expect(() => stagePayments(100_001, { ...stages, stages_percent })).not.toThrow();
  });

  it.each([
    [
      'stages that miss a hair',
      stagesOf(0, [33.3333333333, 33.3333333333, 33.3333333333], 0),
      'parts',
      'stages-not-whole',
    ],
    ['stages over the whole', stagesOf(0, [60, 41], 0), 'parts', 'stages-not-whole'],
    [
      'a deposit and a retention above the contract',
      stagesOf(96, [100], 5),
      'retention_percent',
      'stages-withhold-too-much',
    ],
  ])('refuses %s', (_, stages, entry, code) => {
    expect(complaints(stages)).toEqual([[`stages.${entry}`, code]]);
  });
});
