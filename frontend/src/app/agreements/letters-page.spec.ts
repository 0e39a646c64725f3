import { TestBed } from '@angular/core/testing';
import type { LetterTemplate } from '#shared/agreements/letter-template-schema';
import { OpenedWidget } from '../../test/opened-widget';
import { Notices } from '../core/problems/notices';
import { LettersPage } from './letters-page';

const letterId = '018f0000-0000-7000-8000-000000000601';
const template = (kind: LetterTemplate['kind'], version: number): LetterTemplate => ({
  ...{ kind, version, subject: `About ${kind}`, text: `Dear {client}, ${kind}.` },
  placeholders: ['client', 'link'],
});
const templates = '/api/letter-templates';
const previews = `${templates}/previews`;
const givenUp = '/api/letters/given-up';
const rested = () => new Promise((resolve) => setTimeout(resolve, 550));

async function open(given: { kind?: string; letters?: object[] } = {}) {
  const page = await OpenedWidget.open(LettersPage, { inputs: { kind: given.kind }, roles: ['office'] });
  await page.answer(templates, { items: [template('estimate', 0), template('answer', 4)] });
  await page.answer(givenUp, { items: given.letters ?? [] });
  return page;
}

describe('LettersPage', () => {
  it('opens the kind the address names, else the first, and marks those with words of their own', async () => {
    const page = await open({ kind: 'answer' });
    expect(page.entry('subject').value).toBe('About answer');
    const kinds = [...page.element.querySelectorAll('nav a')].map(({ textContent }) => (textContent ?? '').trim());
    expect(kinds).toEqual(['An estimate', expect.stringMatching(/^An answer\s+own words$/)]);
    expect(page.element.querySelector('nav [aria-current=page]')?.textContent).toContain('An answer');
  });

  it('shows the letter as it would leave, a moment after the last key', async () => {
    const page = await open();
    await page.enter('subject', 'Your estimate of {workshop}');
    page.http.expectNone(previews);
    await rested();
    await page.settle();
    const asked = page.http.expectOne({ method: 'POST', url: previews });
    expect(asked.request.body).toEqual({
      kind: 'estimate',
      subject: 'Your estimate of {workshop}',
      text: 'Dear {client}, estimate.',
    });
    asked.flush({ subject: 'Your estimate of Mill Yard', text: 'Dear Helena Marsh, estimate.', html: '' });
    await page.settle();
    expect(page.element.querySelector('.sheet .subject')?.textContent).toBe('Your estimate of Mill Yard');
    expect(page.element.querySelector('.sheet .text')?.textContent).toBe('Dear Helena Marsh, estimate.');
  });

  it('asks for no letter of one kind with the words of another, while its reader goes from one to the other', async () => {
    const page = await open({ kind: 'estimate' });
    await rested();
    await page.settle();
    await page.answer(previews, { subject: 'About', text: 'Dear', html: '' }, 'POST');
    page.fixture.componentRef.setInput('kind', 'answer');
    await page.settle();
    page.http.expectNone(previews);
    await rested();
    await page.settle();
    const { body } = page.http.expectOne(previews).request;
    expect(body).toEqual({ kind: 'answer', subject: 'About answer', text: 'Dear {client}, answer.' });
  });

  it('says why there is nothing to show where a brace stands alone', async () => {
    const page = await open();
    await page.enter('subject', 'Your { estimate');
    await rested();
    await page.settle();
    await page.refuse(previews, 400, 'A brace stands alone here.');
    expect(page.element.querySelector('.sheet')?.textContent).toContain('A brace stands alone here.');
  });

  it('puts a placeholder at the end of the text', async () => {
    const page = await open();
    await page.press('{link}');
    expect(page.entry('text').value).toBe('Dear {client}, estimate.{link}');
  });

  it('keeps the words on the version that was read', async () => {
    const page = await open({ kind: 'answer' });
    await page.enter('subject', 'An answer for you');
    await page.press('Keep the words');
    const request = page.http.expectOne({ method: 'PUT', url: templates });
    expect([request.request.body, request.request.headers.get('if-match')]).toEqual([
      { kind: 'answer', subject: 'An answer for you', text: 'Dear {client}, answer.' },
      '"4"',
    ]);
    request.flush({ ...template('answer', 5), subject: 'An answer for you' });
    await page.settle();
    expect(TestBed.inject(Notices).current()[0]?.text).toBe('The words are kept.');
    expect(page.entry('subject').value).toBe('An answer for you');
  });

  it('goes back to the first words, which are offered only where there are others', async () => {
    const page = await open({ kind: 'answer' });
    await page.press('Back to the first words');
    const request = page.http.expectOne({ method: 'POST', url: `${templates}/resets` });
    expect(request.request.body).toEqual({ kind: 'answer' });
    request.flush(template('answer', 0));
    await page.settle();
    expect(page.button('Back to the first words')).toBeUndefined();
  });

  it('asks again for letters that did not come', async () => {
    const page = await OpenedWidget.open(LettersPage, { roles: ['office'] });
    await page.refuse(templates, 503, 'Too much at once.');
    await page.press('Ask again');
    await page.answer(templates, { items: [template('estimate', 0)] });
    expect(page.entry('subject').value).toBe('About estimate');
  });
});

describe('GivenUpLetters', () => {
  const letter = {
    ...{ id: letterId, to: 'helena@marsh.example', subject: 'Your estimate', attempts: 9 },
    ...{ writtenAt: '2026-03-01T09:00:00.000Z', givenUpAt: '2026-03-03T09:00:00.000Z' },
    lastError: '550 no such box',
  };
  const sendings = `/api/letters/${letterId}/sendings`;

  it('are shown with whom they were for and what was said, and tried again', async () => {
    const page = await open({ letters: [letter] });
    for (const text of ['helena@marsh.example', 'Given up after 9 tries', '550 no such box'])
      expect(page.text).toContain(text);
    await page.press('Send it again');
    await page.answer(sendings, null, 'POST');
    await page.answer(givenUp, { items: [] });
    expect(TestBed.inject(Notices).current()[0]?.text).toBe('It is tried again.');
    expect(page.text).not.toContain('Not delivered');
  });

  it('say why they could not be tried again', async () => {
    const page = await open({ letters: [letter] });
    await page.press('Send it again');
    await page.refuse(sendings, 404, 'This is not here.');
    await page.answer(givenUp, { items: [letter] });
    expect(TestBed.inject(Notices).current()[0]?.text).toBe('This is not here.');
  });
});
