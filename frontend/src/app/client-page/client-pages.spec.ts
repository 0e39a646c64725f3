import { Location } from '@angular/common';
import { TestBed } from '@angular/core/testing';
import { ActivatedRoute, Router } from '@angular/router';
import { clientId, clientIssue } from '../../test/client-issue';
import { OpenedWidget } from '../../test/opened-widget';
import { Session } from '../core/session/session';
import { ClientOverviewPage } from './client-overview-page';
import { ClientSignInPage } from './client-sign-in-page';
import { ClientVisitPage } from './client-visit-page';

const { letterhead, issue } = clientIssue();
const overviewUrl = '/api/client/overview';
const overview = (more: object = {}) => ({
  ...{ letterhead, client: { name: 'Helena Marsh' }, invoices: [] },
  jobs: [{ id: clientId(11), number: '2026-014', title: 'Pier table', issues: [issue] }],
  ...more,
});

describe('ClientVisitPage', () => {
  const open = async (fragment: string | null) => {
    const replaceState = jest.fn();
    const page = await OpenedWidget.open(ClientVisitPage, {
      providers: [
        { provide: ActivatedRoute, useValue: { snapshot: { fragment } } },
        { provide: Location, useValue: { path: () => '/client', replaceState, subscribe: () => undefined } },
      ],
    });
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigateByUrl').mockResolvedValue(true);
    return { page, navigate, replaceState };
  };

  it('begins the visit with the secret, takes that out of the address, and goes on to the paper that waits', async () => {
    const { page, navigate, replaceState } = await open('secret-of-the-link');
    expect(replaceState).toHaveBeenCalledWith('/client');
    const begun = page.http.expectOne({ method: 'POST', url: '/api/client/visits' });
    expect(begun.request.body).toEqual({ token: 'secret-of-the-link' });
    begun.flush({ token: 'token-of-the-visit', papers: overview(), issue: null });
    await page.settle();
    expect(TestBed.inject(Session).requestToken()).toBe('token-of-the-visit');
    page.http.expectNone(overviewUrl);
    expect(navigate).toHaveBeenCalledWith(`/client/issues/${issue.id}`, { replaceUrl: true });
  });

  it('goes on with a visit that was begun before where the address holds no secret', async () => {
    const { page, navigate } = await open(null);
    page.http.expectNone('/api/client/visits');
    await page.answer(overviewUrl, overview({ jobs: [] }));
    expect(navigate).toHaveBeenCalledWith('/client/papers', { replaceUrl: true });
  });

  it('says that a link is closed, and how to have a new one', async () => {
    const { page } = await open('secret-of-no-use');
    await page.refuse('/api/client/visits', 410, 'This link does not open anything any more.');
    expect(page.element.querySelector('h1')?.textContent).toBe('This link is closed');
    expect(page.element.querySelector('[role=alert]')?.textContent).toBe('This link does not open anything any more.');
    expect(page.element.querySelector('main a')?.getAttribute('href')).toBe('/client/sign-in');
  });
});

describe('ClientOverviewPage', () => {
  const open = async (body: object) => {
    const page = await OpenedWidget.open(ClientOverviewPage);
    await page.answer(overviewUrl, body);
    return page;
  };

  it('lists estimates job by job with where they stand, and variations by their name', async () => {
    const variation = { ...issue, id: clientId(70), kind: 'variation', title: 'Crest', state: 'accepted' };
    const jobs = [{ id: clientId(11), number: '2026-014', title: 'Pier table', issues: [issue, variation] }];
    const page = await open(overview({ jobs }));
    const links = [...page.element.querySelectorAll('main li a')].map((link) => [
      link.getAttribute('href'),
      (link.textContent ?? '').replace(/\s+/g, ' ').trim(),
    ]);
    expect(links).toEqual([
      [`/client/issues/${issue.id}`, expect.stringMatching(/^Estimate, issue B.*€6,150.00.*waits for your answer$/)],
      [`/client/issues/${clientId(70)}`, expect.stringMatching(/^Variation: Crest.*accepted$/)],
    ]);
  });

  it('lists invoices and credit notes with what became of each', async () => {
    const invoice = {
      ...{
        id: clientId(80),
        kind: 'invoice',
        jobId: null,
        number: '2026-0007',
        issuedOn: '2026-03-02',
        currency: 'EUR',
      },
      ...{ dueOn: '2026-03-16', due_minor: 246_00, open_minor: 0, credited_minor: 0, isOverdue: false },
    };
    const page = await open(
      overview({
        invoices: [
          { ...invoice, kind: 'credit-note', number: 'C2026-0001', dueOn: null },
          { ...invoice, id: clientId(81), credited_minor: 246_00 },
          { ...invoice, id: clientId(82), credited_minor: 46_00 },
          { ...invoice, id: clientId(83), open_minor: 246_00, isOverdue: true },
          { ...invoice, id: clientId(84) },
        ],
      }),
    );
    const texts = [...page.element.querySelectorAll('main a[href*="/client/invoices/"]')].map((link) =>
      (link.textContent ?? '').replace(/\s+/g, ' ').trim(),
    );
    expect(texts).toEqual([
      expect.stringMatching(/^Credit note C2026-0001.*[-−]€246\.00.*of /),
      expect.stringMatching(/€246\.00 ?credited$/),
      expect.stringMatching(/settled, €46\.00 of it credited$/),
      expect.stringMatching(/€246\.00 open ?, due .*2026 ?, overdue$/),
      expect.stringMatching(/€246\.00 ?paid$/),
    ]);
    expect(page.text).toContain('Invoices and credit notes');
  });

  it('says that nothing is here yet', async () => {
    expect((await open(overview({ jobs: [] }))).text).toContain('Nothing is here yet.');
  });

  it('says why it cannot be shown', async () => {
    const page = await OpenedWidget.open(ClientOverviewPage);
    await page.refuse(overviewUrl, 401, 'Your visit is over.');
    expect(page.element.querySelector('h1')?.textContent).toBe('Your papers cannot be shown');
    expect(page.text).toContain('Your visit is over.');
  });
});

describe('ClientSignInPage', () => {
  const letters = '/api/client/sign-in-letters';

  it('asks for the link, and does not say whether the address is known', async () => {
    const page = await OpenedWidget.open(ClientSignInPage);
    await page.enter('email', 'helena@marsh.example');
    await page.press('Send the link');
    const request = page.http.expectOne({ method: 'POST', url: letters });
    expect(request.request.body).toEqual({ email: 'helena@marsh.example' });
    request.flush(null);
    await page.settle();
    expect(page.element.querySelector('[role=status]')?.textContent).toContain(
      'If a workshop knows helena@marsh.example',
    );
  });

  it('sends nothing to what is no address', async () => {
    const page = await OpenedWidget.open(ClientSignInPage);
    await page.enter('email', 'helena');
    await page.press('Send the link');
    page.http.expectNone(letters);
    expect(page.element.querySelector('[role=alert]')).not.toBeNull();
  });
});
