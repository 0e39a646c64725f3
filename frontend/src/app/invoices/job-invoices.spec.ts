import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import type { ContractAccountAnswer } from '#shared/invoices/contract-account-endpoints';
import { Notices } from '../core/problems/notices';
import { BooksVisit, invoiceId, pageOf, sampleDraft, sampleSummary } from '../../test/sample-invoices';
import { JobInvoices } from './job-invoices';

const job = {
  ...{ id: invoiceId(30), version: 1, number: '2026-011', title: 'Pier table', clientId: invoiceId(90) },
  ...{ clientName: 'Ashgrove House', kind: 'new', reference: '', site: '', note: '', state: 'accepted' },
  changedAt: '2026-05-04T10:00:00.000Z',
};

const issueId = invoiceId(40);
const work = { of: 'work', from_percent: '40', to_percent: '100' } as const;
const contract: ContractAccountAnswer = {
  ...{ currency: 'EUR', gross_minor: 1_230_00, invoiced_minor: 400_00, credited_minor: 50_00, left_minor: 880_00 },
  parts: [
    {
      ...{ issueId, kind: 'estimate', number: '2026-011-1', title: 'Pier table', acceptedOn: '2026-05-04' },
      ...{ net_minor: 1_000_00, gross_minor: 1_230_00, invoiced_minor: 400_00, credited_minor: 50_00 },
      ...{ left_minor: 880_00, isComplete: false },
      next: [
        {
          claim: { of: 'deposit' },
          name: '',
          plannedOn: null,
          reachedOn: null,
          net_minor: 300_00,
          gross_minor: 369_00,
        },
        {
          claim: work,
          name: 'Delivered',
          plannedOn: '2026-07-01',
          reachedOn: null,
          net_minor: 415_45,
          gross_minor: 511_00,
        },
      ],
    },
  ],
};

@Component({
  selector: 'app-test-job',
  imports: [JobInvoices],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-job-invoices [job]="job" />`,
})
class TestJob {
  protected readonly job = job as never;
}

describe('JobInvoices', () => {
  const account = `/api/jobs/${job.id}/contract-account`;
  const stage = `/api/jobs/${job.id}/stage-invoices`;
  const begin = async (roles: NonNullable<Parameters<typeof BooksVisit.begin>[1]['roles']> = ['office']) => {
    const visit = await BooksVisit.begin(TestJob, { path: 'job', address: '/job', roles });
    await visit.answer('GET', account, { contract });
    await visit.answer('GET', '/api/invoices', pageOf([sampleSummary({ state: 'draft', number: null })]));
    return visit;
  };

  it('shows what of the contract is invoiced, credited and left, and what may come next with its day', async () => {
    const visit = await begin();
    for (const text of ['€1,230.00', '€400.00', '€50.00', '€880.00', 'Deposit', '€369.00', 'Delivered', '€511.00'])
      expect(visit.text).toContain(text);
    expect([...visit.element.querySelectorAll<HTMLInputElement>('input[type=date]')].map(({ value }) => value)).toEqual(
      ['', '2026-07-01', ''],
    );
  });

  it('drafts the invoice of a claim under the same id when it is pressed again, and says why it is refused', async () => {
    const visit = await begin();
    await visit.press('Draft the invoice, Deposit');
    const first = visit.request('POST', stage);
    expect(first.request.body).toMatchObject({ issueId, claim: { of: 'deposit' } });
    const taken = { type: 'urn:problem:invoice-claim-taken', title: 'This is invoiced already, or not due yet.' };
    first.flush({ ...taken, status: 409, instance: '', errors: [] }, { status: 409, statusText: 'Conflict' });
    await visit.settle();
    // What may come next is asked anew, since somebody else was faster.
    await visit.answer('GET', account, { contract });
    await visit.press('Draft the invoice, Deposit');
    const second = visit.request('POST', stage);
    expect(second.request.body).toEqual(first.request.body);
    const { invoiceId: id } = second.request.body as { invoiceId: string };
    second.flush(sampleDraft({ id }));
    await visit.settle();
    expect(TestBed.inject(Router).url).toBe(`/accounts/invoices/${id}`);
  });

  it('invoices the share that is done, from where the work nothing claims begins', async () => {
    const visit = await begin();
    await visit.press('Invoice by the share that is done');
    await visit.type('So much of the work is done', '40');
    expect(visit.button('Draft the invoice')?.disabled).toBe(true);
    await visit.type('So much of the work is done', '62.5');
    await visit.press('Draft the invoice');
    const { claim } = visit.request('POST', stage).request.body as { claim: unknown };
    expect(claim).toEqual({ of: 'work', from_percent: '40', to_percent: '62.5' });
  });

  it('names the day a stage was reached on, takes it back, and says why it is refused', async () => {
    const days = `/api/jobs/${job.id}/stage-days`;
    const visit = await begin();
    const enter = async (day: string) => {
      const entry = [...visit.element.querySelectorAll<HTMLInputElement>('input[type=date]')][2];
      entry.value = day;
      entry.dispatchEvent(new Event('change'));
      await visit.settle();
      return visit.request('PUT', days);
    };
    const first = await enter('2026-05-06');
    expect(first.request.body).toEqual({ issueId, claim: work, of: 'reached', day: '2026-05-06' });
    first.flush(null);
    await visit.settle();
    await visit.answer('GET', account, { contract });
    const second = await enter('');
    expect(second.request.body).toMatchObject({ of: 'reached', day: null });
    const errors = [{ path: ['body', 'day'], message: 'The day lies in the future.' }];
    const problem = { type: 'urn:problem:problem-invalid', title: 'Wrong.', status: 400, instance: '', errors };
    second.flush(problem, { status: 400, statusText: 'Bad Request' });
    await visit.settle();
    expect(
      TestBed.inject(Notices)
        .current()
        .map(({ text }) => text),
    ).toEqual(['The day lies in the future.']);
    await visit.answer('GET', account, { contract });
  });

  const shown = async (part: Partial<ContractAccountAnswer['parts'][number]>) => {
    const visit = await BooksVisit.begin(TestJob, { path: 'job', address: '/job', roles: ['office'] });
    const sums = { invoiced_minor: 1_230_00, credited_minor: 50_00, left_minor: 50_00 };
    const parts = [{ ...contract.parts[0], ...sums, next: [], ...part }];
    await visit.answer('GET', account, { contract: { ...contract, ...sums, parts } });
    await visit.answer('GET', '/api/invoices', pageOf([]));
    return visit;
  };

  it('offers again what was credited of an invoice that stands', async () => {
    const claim = { of: 'again', invoiceId: issueId } as const;
    const next = { claim, name: '2026-0007', plannedOn: null, reachedOn: null, net_minor: 40_65, gross_minor: 50_00 };
    const visit = await shown({ next: [next] });
    expect(visit.text).not.toContain('All of it is invoiced.');
    await visit.press('Draft the invoice, Again, what was credited of 2026-0007');
    expect(visit.request('POST', stage).request.body).toMatchObject({ issueId, claim });
  });

  it('offers what a variation takes away as a credit note, and no share of it', async () => {
    const claim = { of: 'work', from_percent: '0', to_percent: '100' } as const;
    const next = { claim, name: '', plannedOn: null, reachedOn: null, net_minor: -350_00, gross_minor: -420_00 };
    const visit = await shown({ kind: 'variation', gross_minor: -420_00, next: [next] });
    expect(visit.text).toContain('−€420.00');
    expect(visit.button('Invoice by the share that is done')).toBeUndefined();
    await visit.press('Draft the credit note, Taken away, to be credited');
    expect(visit.request('POST', stage).request.body).toMatchObject({ issueId, claim });
  });

  it('says of what was taken away that it is credited, not invoiced', async () => {
    const visit = await shown({ kind: 'variation', gross_minor: -420_00, isComplete: true });
    expect(visit.text).toContain('All of it is credited.');
  });

  it('lets the estimator plan and draft nothing', async () => {
    const visit = await begin(['estimator']);
    expect(visit.element.querySelectorAll('button')).toHaveLength(0);
    expect(visit.element.querySelectorAll('input[type=date]')).toHaveLength(3);
  });
});
