import type { CostedEstimate } from '#shared/estimates/estimate-schema';
import { changeEstimate, readEstimate } from '#shared/estimates/estimates-endpoints';
import type { Problem } from '#shared/problems/problem-schema';
import { sampleEstimate, type SampleEstimate } from './sample-estimate';
import { startApi, type Api } from './start-api';

/** Limits of the trade that hold whoever asks (ASVS 2.1.3, 2.3.2); those of payments and credit notes stand in their own specs. */
let api: Api;
let sample: SampleEstimate;
beforeAll(async () => {
  api = await startApi();
  sample = await sampleEstimate(api.ours);
}, 60_000);
afterAll(() => api.stop());

const read = async (): Promise<CostedEstimate> =>
  (await api.as('owner').call(readEstimate, { params: { estimateId: sample.estimateId } })).body as CostedEstimate;

const stages = (settings: CostedEstimate['settings'], more: object) => ({ stages: { ...settings.stages, ...more } });

describe('an estimate', () => {
  it.each<[string, (settings: CostedEstimate['settings']) => object, string]>([
    ['a discount over 100 %', () => ({ discount: { way: 'percent', amount: '100.01' } }), 'discount.amount'],
    ['a discount below nothing', () => ({ discount: { way: 'amount', amount: '-1' } }), 'discount.amount'],
    ['a negative deposit', (settings) => stages(settings, { deposit_percent: -1 }), 'stages.deposit_percent'],
    ['a deposit over the whole', (settings) => stages(settings, { deposit_percent: 101 }), 'stages.deposit_percent'],
    ['a negative retention', (settings) => stages(settings, { retention_percent: -0.5 }), 'stages.retention_percent'],
    [
      'deposit and retention over the whole together',
      (settings) => stages(settings, { deposit_percent: 60, retention_percent: 41 }),
      'stages.retention_percent',
    ],
    ['a margin of 100 %', () => ({ profit: { way: 'margin', percent: '100' } }), 'profit.percent'],
    ['a contingency below nothing', () => ({ contingency: { way: 'share', percent: '-5' } }), 'contingency.percent'],
  ])('refuses %s beside its entry, and stays as it was', async (_what, changed, entry) => {
    const before = await read();
    const { settings, settingsVersion } = before;
    const content = { ...settings, ...changed(settings) };
    const changes = [{ kind: 'settings', id: sample.estimateId, version: settingsVersion, content }];
    const { estimateId } = sample;
    const refused = await api.as('owner').call(changeEstimate, { params: { estimateId }, body: { changes } });
    expect(refused.status).toBe(400);
    const places = ((refused.body as Problem).errors ?? []).map(({ path }) => path.slice(-entry.split('.').length));
    expect(places.map((path) => path.join('.'))).toContain(entry);
    expect(await read()).toEqual(before);
  });
});
