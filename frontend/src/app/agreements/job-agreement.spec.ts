import { TestBed } from '@angular/core/testing';
import { Router } from '@angular/router';
import type { Role } from '#shared/actor/role';
import { OpenedWidget } from '../../test/opened-widget';
import { Notices } from '../core/problems/notices';
import { JobAgreement } from './job-agreement';

const id = (number: number) => `018f0000-0000-7000-8000-0000000005${number}`;
const job = { id: id(10), changedAt: '2026-03-02T10:00:00.000Z' };
const plan = { deposit_percent: '40', stages_percent: ['60'], retention_percent: '0' };
const part = (number: string, kind: 'estimate' | 'variation', net_minor: number) => ({
  ...{ issueId: id(20), estimateId: id(21), kind, number, title: `Pier table ${number}`, acceptedOn: '2026-03-02' },
  ...{
    choice: [],
    taxes: [],
    exemptions: [],
    net_minor,
    tax_minor: 0,
    gross_minor: net_minor,
    plan,
    stageNames: ['Delivery'],
  },
});
const contract = (...parts: ReturnType<typeof part>[]) => ({
  ...{ jobId: job.id, clientId: id(30), currency: 'EUR', parts },
  ...{ net_minor: 5_400_00, tax_minor: 1_242_00, gross_minor: 6_642_00 },
});
const decision = {
  ...{
    id: id(40),
    issueId: id(20),
    number: '2026-014-1 A',
    kind: 'accepted',
    typedName: 'Helena Marsh',
    at: '2026-03-02T10:30:00.000Z',
  },
  ...{ address: '203.0.113.7', choice: [], alternatives: [], reason: '', net_minor: 5_000_00, tax_minor: 1_150_00 },
  ...{ gross_minor: 6_150_00, pdfSha256: 'ab'.repeat(32) },
};
const question = {
  ...{ id: id(50), issueId: id(20), author: 'client', name: 'Helena Marsh' },
  ...{ text: 'Near a stove?', at: '2026-03-01T10:30:00.000Z' },
};

const estimate = (kind: 'estimate' | 'variation') => ({
  ...{ id: id(61), kind, number: '1', title: '', letter: null, members: 0 },
  changedAt: '2026-03-02T10:00:00.000Z',
});

async function open(given: { agreement?: object; questions?: object[]; roles?: readonly Role[] } = {}) {
  const { agreement = { contract: null, decisions: [] }, questions = [], roles = ['estimator'] } = given;
  const widget = await OpenedWidget.open(JobAgreement, { inputs: { job }, roles });
  await widget.answer(`/api/jobs/${job.id}/agreement`, agreement);
  await widget.answer(`/api/jobs/${job.id}/questions`, { items: questions });
  return widget;
}

describe('JobAgreement', () => {
  it('shows nothing where nothing was agreed or asked', async () => {
    expect((await open()).text).toBe('');
  });

  it('shows the contract part by part, and what it comes to', async () => {
    const agreed = contract(part('2026-014-1', 'estimate', 5_000_00), part('2026-014-2', 'variation', 400_00));
    const widget = await open({ agreement: { contract: agreed, decisions: [] } });
    const cells = [...widget.element.querySelectorAll('tr')]
      .slice(1)
      .map((row) =>
        [...row.querySelectorAll('td')].map((cell) => (cell.textContent ?? '').replace(/\s+/g, ' ').trim()),
      );
    expect(cells).toEqual([
      ['Pier table 2026-014-1 2026-014-1', '2 Mar 2026', '€5,000.00'],
      ['Pier table 2026-014-2 2026-014-2', '2 Mar 2026', '€400.00'],
      ['Net', '€5,400.00'],
      ['With tax', '€6,642.00'],
    ]);
  });

  it('tells who accepted, when and from where, with the very paper and its fingerprint', async () => {
    const widget = await open({ agreement: { contract: null, decisions: [decision] } });
    for (const text of [
      'Accepted by Helena Marsh, €6,150.00 with tax',
      '2026-014-1 A',
      '10:30',
      '203.0.113.7',
      'ab'.repeat(32),
    ])
      expect(widget.text).toContain(text);
    expect(widget.text).not.toContain('Chosen');
    expect(widget.element.querySelector('a')?.getAttribute('href')).toBe(`/api/decisions/${id(40)}/estimate.pdf`);
  });

  it('names the alternatives that were chosen', async () => {
    const chosen = { ...decision, choice: [id(80), id(81)], alternatives: ['Back legs toned, not gilt', 'A crate'] };
    const widget = await open({ agreement: { contract: null, decisions: [chosen] } });
    expect(widget.text).toContain('Chosen: Back legs toned, not gilt, A crate');
  });

  it('tells why it was declined', async () => {
    const declined = { ...decision, kind: 'declined', reason: 'Too late for us.', pdfSha256: '' };
    const widget = await open({ agreement: { contract: null, decisions: [declined] } });
    expect(widget.text).toContain('Declined 2026-014-1 AToo late for us.');
    expect(widget.element.querySelector('a')).toBeNull();
  });

  it('begins one variation however often it is pressed, and goes there', async () => {
    const widget = await open({ agreement: { contract: contract(part('1', 'estimate', 1)), decisions: [] } });
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigate').mockResolvedValue(true);
    widget.button('Begin a variation')?.click();
    widget.button('Begin a variation')?.click();
    await widget.answer(`/api/jobs/${job.id}/estimates`, { items: [estimate('estimate'), estimate('variation')] });
    const begun = widget.http.expectOne({ method: 'POST', url: `/api/jobs/${job.id}/variations` });
    expect(begun.request.body).toEqual({ id: expect.stringMatching(/^[0-9a-f-]{36}$/), title: 'Variation 2' });
    begun.flush({
      ...{ id: id(60), kind: 'variation', number: '2', title: 'Variation 2', letter: null, members: 0 },
      changedAt: '2026-03-02T10:00:00.000Z',
    });
    await widget.settle();
    expect(navigate).toHaveBeenCalledWith(['/jobs', job.id, 'estimates', id(60), 'measure']);
  });

  it('says why no variation could be begun', async () => {
    const widget = await open({ agreement: { contract: contract(part('1', 'estimate', 1)), decisions: [] } });
    await widget.press('Begin a variation');
    await widget.answer(`/api/jobs/${job.id}/estimates`, { items: [] });
    await widget.refuse(`/api/jobs/${job.id}/variations`, 409, 'The workshop works in another currency now.');
    expect(TestBed.inject(Notices).current()[0]?.text).toBe('The workshop works in another currency now.');
    expect(widget.button('Begin a variation')?.disabled).toBe(false);
  });

  it('lets the office read it and begin nothing', async () => {
    const agreement = { contract: contract(part('1', 'estimate', 1)), decisions: [] };
    expect((await open({ agreement, roles: ['office'] })).button('Begin a variation')).toBeUndefined();
  });
});

describe('JobThread', () => {
  it('is answered where it was asked, and shows the answer at once', async () => {
    const widget = await open({ questions: [{ ...question, issueId: id(70), id: id(51) }, question] });
    await widget.enter('text', 'Two metres off.');
    await widget.press('Answer');
    const request = widget.http.expectOne({ method: 'POST', url: `/api/jobs/${job.id}/questions` });
    expect(request.request.body).toEqual({ issueId: id(20), text: 'Two metres off.' });
    request.flush({ ...question, id: id(52), author: 'workshop', name: 'Imke Vale', text: 'Two metres off.' });
    await widget.settle();
    const last = widget.element.querySelector('li:last-child');
    expect([last?.className, last?.querySelector('.text')?.textContent]).toEqual(['workshop', 'Two metres off.']);
    expect(widget.entry('text').value).toBe('');
  });

  it('keeps what was written where it could not be sent', async () => {
    const widget = await open({ questions: [question] });
    await widget.enter('text', 'Two metres off.');
    await widget.press('Answer');
    await widget.refuse(`/api/jobs/${job.id}/questions`, 503, 'Too much at once.');
    expect([widget.entry('text').value, widget.text.includes('Too much at once.')]).toEqual(['Two metres off.', true]);
  });
});
