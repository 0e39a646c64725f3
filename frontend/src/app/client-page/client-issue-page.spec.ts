import { clientId, clientIssue, clientPrice, ClientVisit, offered } from '../../test/client-issue';
import { TestBed } from '@angular/core/testing';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { Session } from '../core/session/session';

type State = ClientIssue['issue']['state'];

const inState = (state: State, more: Partial<ClientIssue> = {}): ClientIssue => {
  const issue = clientIssue(more);
  return { ...issue, issue: { ...issue.issue, state } };
};
const decision = (kind: 'accepted' | 'declined'): NonNullable<ClientIssue['decision']> => ({
  ...{ kind, typedName: 'Helena Marsh', at: '2026-03-05T10:30:00.000Z', choice: [], reason: '' },
  ...{ gross_minor: 6_150_00, pdfSha256: '' },
});
const answer = (visit: ClientVisit) =>
  (visit.element.querySelector('[role=status]')?.textContent ?? '').replace(/\s+/g, ' ').trim();

describe('ClientIssuePage', () => {
  it('writes figures as the workshop does whose page it is, and keeps nobody signed in', async () => {
    await ClientVisit.begin();
    const session = TestBed.inject(Session);
    expect([session.reader()?.currency, session.isSignedIn()]).toEqual(['EUR', false]);
  });

  it('is open until its last day, and says that nothing is agreed yet', async () => {
    const visit = await ClientVisit.begin();
    expect(visit.text).toContain('Issue B, for you until');
    expect(visit.text).toContain('Thursday 30 April');
    expect(visit.text).toContain('Nothing is agreed before you type your name there and accept.');
    expect(answer(visit)).toBe('');
  });

  it.each<[State, Partial<ClientIssue>, RegExp]>([
    ['accepted', { decision: decision('accepted') }, /^Accepted by Helena Marsh on 5 Mar 2026 at 10:30, €6,150.00/],
    ['accepted', {}, /^It was accepted\.$/],
    ['declined', { decision: decision('declined') }, /^It was declined\. Thank you/],
    ['replaced', { replacedBy: clientId(77) }, /^A later issue stands in its place/],
    ['past-validity', {}, /^It held until 30 Apr 2026 and can no longer be accepted/],
  ])('once %s it says so and cannot be answered', async (state, more, sentence) => {
    const visit = await ClientVisit.begin(inState(state, more));
    expect(answer(visit)).toMatch(sentence);
    expect([visit.button('Review'), visit.button('Decline this estimate')]).toEqual([undefined, undefined]);
    expect([...visit.element.querySelectorAll('fieldset')].every(({ disabled }) => disabled)).toBe(true);
    expect(visit.button('Ask')).toBeDefined();
  });

  it('leads from a replaced issue to the later one', async () => {
    const visit = await ClientVisit.begin(inState('replaced', { replacedBy: clientId(77) }));
    const later = [...visit.element.querySelectorAll('a')].find(
      ({ textContent }) => textContent === 'Read the later issue',
    );
    expect(later?.getAttribute('href')).toBe(`/client/issues/${clientId(77)}`);
  });

  it('links to the paper of what is chosen', async () => {
    const visit = await ClientVisit.begin();
    const paper = () => visit.element.querySelector('.papers a')?.getAttribute('href');
    expect(paper()).toBe(`/api/client/issues/${clientId(10)}/estimate.pdf`);
    await visit.choose('A crate');
    expect(paper()).toBe(`/api/client/issues/${clientId(10)}/estimate.pdf?choice=${offered.crate}`);
    visit.asked('prices');
  });

  it('says by when it is ready where that was planned, and of another choice that it is planned anew', async () => {
    const programme = { startsOn: '2026-05-04', finishesOn: '2026-06-02', offeredOn: '2026-06-04', workingDays: 21 };
    const visit = await ClientVisit.begin(clientIssue({ programme }));
    expect(visit.text).toContain(
      'Work starts on 4 May 2026 at the earliest and goes on until 2 Jun 2026; the workshop is open on 21 days of that time. Offered for 4 Jun 2026.',
    );
    expect(visit.element.querySelector('.bar .muted')?.textContent).toContain('ready by');
    await visit.choose('Oil gilding');
    visit.asked('prices').flush(clientPrice(5_535_00, { choice: [offered.oil] }));
    await visit.settle();
    expect(visit.text).not.toContain('Work starts on');
    expect(visit.text).toContain('the dates are planned anew');
    expect(visit.element.querySelector('.bar .muted')?.textContent).toBe('tax included');
  });

  it('speaks of no tax where none is in the sum', async () => {
    const price = { ...clientPrice(5_000_00), taxes: [], tax_minor: 0 };
    const visit = await ClientVisit.begin(clientIssue({ price }));
    expect(visit.element.querySelector('.bar .muted')?.textContent).toBe('');
  });

  it('says why it cannot be shown, and how to come to one’s papers all the same', async () => {
    const visit = await ClientVisit.begin();
    visit.fixture.componentRef.setInput('issueId', clientId(99));
    await visit.settle();
    const problem = { type: 'about:blank', title: 'This link opens nothing.', status: 401, instance: '', errors: [] };
    visit.http
      .expectOne(`/api/client/issues/${clientId(99)}`)
      .flush(problem, { status: 401, statusText: 'Unauthorized' });
    await visit.settle();
    expect(visit.element.querySelector('h1')?.textContent).toBe('This paper cannot be shown');
    expect(visit.element.querySelector('[role=alert]')?.textContent).toBe('This link opens nothing.');
    expect(visit.element.querySelector('main a')?.getAttribute('href')).toBe('/client/sign-in');
  });
});

describe('Declining', () => {
  it('is told with its reason, and shown at once', async () => {
    const visit = await ClientVisit.begin();
    await visit.press('Decline this estimate');
    await visit.enter('reason', 'The time does not suit.');
    await visit.press('Decline it');
    const request = visit.asked('refusal');
    expect(request.request.body).toEqual({ reason: 'The time does not suit.' });
    request.flush(decision('declined'));
    await visit.settle();
    expect(answer(visit)).toMatch(/^It was declined/);
  });

  it('can be left again', async () => {
    const visit = await ClientVisit.begin();
    await visit.press('Decline this estimate');
    await visit.press('Back to reading it');
    visit.http.expectNone((request) => request.url.endsWith('/refusal'));
    expect(visit.button('Review')).toBeDefined();
  });
});

describe('The thread', () => {
  const question = {
    ...{ id: clientId(50), issueId: clientId(10), author: 'client' as const, name: 'Helena Marsh' },
    ...{ text: 'Can it stand near a stove?', at: '2026-03-05T10:30:00.000Z' },
  };

  it('shows what was asked and answered, and by whom', async () => {
    const reply = {
      ...question,
      id: clientId(51),
      author: 'workshop' as const,
      name: 'Imke Vale',
      text: 'Two metres off.',
    };
    const visit = await ClientVisit.begin(clientIssue({ questions: [question, reply] }));
    const entries = [...visit.element.querySelectorAll('app-client-thread li')];
    expect(entries.map((one) => [one.className, one.querySelector('.text')?.textContent])).toEqual([
      ['client', 'Can it stand near a stove?'],
      ['workshop', 'Two metres off.'],
    ]);
    expect(entries[1]?.textContent).toContain('Imke Vale');
  });

  it('takes a question, and leaves what was chosen alone', async () => {
    const visit = await ClientVisit.begin();
    await visit.choose('Silver leaf');
    visit.asked('prices').flush(clientPrice(5_250_00, { choice: [offered.silver] }));
    await visit.settle();
    await visit.enter('text', question.text);
    await visit.press('Ask');
    const request = visit.asked('questions');
    expect(request.request.body).toEqual({ text: question.text });
    request.flush(question);
    await visit.settle();
    visit.http.match((one) => one.url.endsWith('/prices')).forEach((one) => one.flush(clientPrice(5_250_00)));
    await visit.settle();
    expect(visit.element.querySelector('app-client-thread .text')?.textContent).toBe(question.text);
    expect(visit.element.querySelector<HTMLTextAreaElement>('[formcontrolname=text]')?.value).toBe('');
    expect(visit.choice('Silver leaf').checked).toBe(true);
  });

  it('sends no empty question', async () => {
    const visit = await ClientVisit.begin();
    await visit.press('Ask');
    visit.http.expectNone((request) => request.url.endsWith('/questions'));
    expect(visit.element.querySelector('app-client-thread [role=alert]')).not.toBeNull();
  });
});
