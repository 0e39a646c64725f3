import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import { firstPaper } from '#shared/client-page/first-paper';

type Issue = ClientOverview['jobs'][number]['issues'][number];

const issue = (id: string, state: Issue['state']): Issue => ({
  ...{ id, state, kind: 'estimate', number: '2026-001', letter: 'A', title: 'Pier table' },
  ...{ issuedOn: '2026-01-02', validUntil: '2026-02-02', gross_minor: 100_00, currency: 'EUR' },
});
const job = (...issues: Issue[]) => ({ id: 'j', number: '2026-001', title: 'Pier table', issues });
const invoice = (open_minor: number) => ({
  ...{ id: 'i', jobId: null, number: '2026-7', issuedOn: '2026-01-02', dueOn: '2026-02-02' },
  ...{ kind: 'invoice' as const, credited_minor: 0, isOverdue: false },
  ...{ due_minor: 100_00, open_minor, currency: 'EUR' },
});

describe('firstPaper', () => {
  it.each([
    ['the only paper, whatever became of it', { jobs: [job(issue('a', 'accepted'))], invoices: [] }, 'a'],
    [
      'the only one that waits for an answer',
      { jobs: [job(issue('b', 'open'), issue('a', 'replaced'))], invoices: [invoice(0)] },
      'b',
    ],
    [
      'all of them where two wait',
      { jobs: [job(issue('a', 'open')), job(issue('b', 'open'))], invoices: [] },
      undefined,
    ],
    ['all of them where something is owed too', { jobs: [job(issue('a', 'open'))], invoices: [invoice(5)] }, undefined],
    ['all of them where there is none', { jobs: [], invoices: [] }, undefined],
  ])('leads to %s', (_sentence, overview, issueId) => {
    expect(firstPaper(overview)).toBe(issueId);
  });
});
