import { planStage } from '#shared/invoices/contract-account-endpoints';
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
    const plan = (jobId: string, claim: DueStage['claim'], plannedOn: string, issueId: string) =>
      api.as('office').call(planStage, { params: { jobId }, body: { issueId, claim, plannedOn } });
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
