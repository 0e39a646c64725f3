import { listHistory } from '#shared/audit/history-endpoints';
import {
  nameStageDay,
  readContractAccount,
  type ContractAccountAnswer,
} from '#shared/invoices/contract-account-endpoints';
import { listDueStages, type DueStage } from '#shared/invoices/due-stages-endpoints';
import { acceptedIssue } from './sample-client-visit';
import { sayWho, stageInvoice } from './sample-invoice';
import { startApi, type Api } from './start-api';

let api: Api;
beforeAll(async () => {
  api = await startApi();
  await sayWho(api.ours);
}, 60_000);
afterAll(() => api.stop());

interface Listed {
  readonly items: DueStage[];
  readonly next: string | null;
  readonly count: number;
}

const list = async (query: { limit?: number; cursor?: string } = {}): Promise<Listed> =>
  (await api.as('office').call(listDueStages, { query })).body as Listed;
const whole = { of: 'work', from_percent: '0', to_percent: '100' } as const;

describe('What can be invoiced', () => {
  it('is listed across jobs by its day, what has none at the end, page by page without a gap', async () => {
    const [later, sooner, undated] = [
      await acceptedIssue(api.ours, api),
      await acceptedIssue(api.ours, api),
      await acceptedIssue(api.ours, api),
    ];
    const plan = (jobId: string, claim: DueStage['claim'], day: string, issueId: string) =>
      api.as('office').call(nameStageDay, { params: { jobId }, body: { issueId, claim, of: 'planned', day } });
    for (const [{ jobId, issueId }, day] of [
      [later, '2031-05-01'],
      [sooner, '2031-04-01'],
    ] as const) {
      const claim = (await list({ limit: 100 })).items.find((one) => one.issueId === issueId)?.claim ?? whole;
      expect((await plan(jobId, claim, day, issueId)).status).toBe(204);
    }
    const { items, count } = await list({ limit: 100 });
    const days = items.map(({ dueOn }) => dueOn ?? '9999-12-31');
    expect(days).toEqual(days.toSorted());
    const placeOf = (issueId: string) => items.findIndex((one) => one.issueId === issueId);
    expect(placeOf(sooner.issueId)).toBeLessThan(placeOf(later.issueId));
    expect(items.some(({ issueId }) => issueId === undated.issueId)).toBe(true);
    expect(items.every(({ gross_minor, jobTitle, clientName }) => gross_minor > 0 && jobTitle && clientName)).toBe(
      true,
    );
    const paged: DueStage[] = [];
    let cursor: string | null = null;
    do {
      const page: Listed = await list({ limit: 2, ...(cursor === null ? {} : { cursor }) });
      paged.push(...page.items);
      cursor = page.next;
    } while (cursor !== null);
    expect(paged).toEqual(items);
    expect(count).toBe(items.length);
  });

  describe('of a stage that waits for its milestone', () => {
    const name = (
      { jobId, issueId }: { readonly jobId: string; readonly issueId: string },
      of: 'planned' | 'reached',
      { day, claim = whole }: { readonly day: string | null; readonly claim?: DueStage['claim'] },
    ) => api.as('office').call(nameStageDay, { params: { jobId }, body: { issueId, claim, of, day } });
    /** The stage with which all work is done. */
    const isLast = ({ claim }: Pick<DueStage, 'claim'>) => claim.of === 'work' && claim.to_percent === '100';
    const workOf = async (issueId: string) =>
      (await list({ limit: 100 })).items.find((one) => one.issueId === issueId && isLast(one));
    const daysOf = async (jobId: string) => {
      const { body } = await api.as('office').call(readContractAccount, { params: { jobId } });
      const { contract } = body as { contract: ContractAccountAnswer };
      const next = contract.parts[0].next.find(isLast);
      return [next?.plannedOn, next?.reachedOn];
    };

    it('is due from the day it was reached on, whatever was planned, and waits again when that is taken back', async () => {
      const sample = await acceptedIssue(api.ours, api);
      expect(await workOf(sample.issueId)).toMatchObject({ dueOn: null, isReached: false });
      await name(sample, 'planned', { day: '2031-04-01' });
      const today = await api.app.rateCards.service.today(api.ours.id);
      expect((await name(sample, 'reached', { day: today })).status).toBe(204);
      expect(await workOf(sample.issueId)).toMatchObject({ dueOn: today, isReached: true });
      expect(await daysOf(sample.jobId)).toEqual(['2031-04-01', today]);
      await name(sample, 'reached', { day: null });
      expect(await workOf(sample.issueId)).toMatchObject({ dueOn: '2031-04-01', isReached: false });
      await name(sample, 'planned', { day: null });
      expect(await workOf(sample.issueId)).toMatchObject({ dueOn: null, isReached: false });
    });

    it('keeps its days for what is left when a share of it is invoiced', async () => {
      const sample = await acceptedIssue(api.ours, api);
      await name(sample, 'reached', { day: '2026-01-05' });
      await stageInvoice(api.ours, sample, { ...whole, to_percent: '90' });
      expect(await workOf(sample.issueId)).toMatchObject({
        ...{ dueOn: '2026-01-05', isReached: true },
        claim: { of: 'work', from_percent: '90', to_percent: '100' },
      });
    });

    it('is told in the history of the job by its name and day', async () => {
      const sample = await acceptedIssue(api.ours, api);
      await name(sample, 'reached', { day: '2026-01-05' });
      await name(sample, 'reached', { day: null });
      const { body } = await api.as('owner').call(listHistory, { query: { jobId: sample.jobId } });
      const { items } = body as { items: { code: string; values: Record<string, string> }[] };
      expect(items.slice(0, 2).map(({ code }) => code)).toEqual(['history-stage-not-reached', 'history-stage-reached']);
      expect(items[1].values).toMatchObject({ day: '2026-01-05' });
    });

    it('is not reached in the future, and what waits for nothing is not reached at all', async () => {
      const sample = await acceptedIssue(api.ours, api);
      const late = await name(sample, 'reached', { day: '2099-01-01' });
      expect(late.status).toBe(400);
      expect(JSON.stringify(late.body)).toContain('The day lies in the future.');
      const deposit = await name(sample, 'reached', { day: '2026-01-05', claim: { of: 'deposit' } });
      expect(deposit.status).toBe(409);
      expect(await daysOf(sample.jobId)).toEqual([null, null]);
    });
  });

  it('is so no more once it is invoiced', async () => {
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    expect((await list({ limit: 100 })).items.map((one) => one.issueId)).toContain(issueId);
    await stageInvoice(api.ours, { jobId, issueId }, whole);
    const left = (await list({ limit: 100 })).items.filter((one) => one.issueId === issueId);
    expect(left.map(({ claim }) => claim.of)).not.toContain('work');
  });

  it('is read in as many queries for many jobs as for few', async () => {
    const statements = async () => {
      const before = api.platform.database.statements;
      await list();
      return api.platform.database.statements - before;
    };
    await acceptedIssue(api.ours, api);
    const few = await statements();
    for (let more = 0; more < 3; more += 1) await acceptedIssue(api.ours, api);
    expect(await statements()).toBe(few);
    expect(few).toBeLessThan(20);
  });
});
