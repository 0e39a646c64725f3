import { TestBed } from '@angular/core/testing';
import { OpenedWidget } from '../../test/opened-widget';
import { NOW } from '../core/now';
import { Notices } from '../core/problems/notices';
import { IssueSending } from './issue-sending';

const id = (number: number) => `018f0000-0000-7000-8000-0000000004${number}`;
const issue = { id: id(10), state: 'issued', validUntil: '2026-04-30' };
const given = `/api/issues/${id(10)}/accesses`;
const listed = `/api/jobs/${id(11)}/accesses`;
const access = {
  ...{ id: id(20), purpose: 'link', createdAt: '2026-03-01T09:00:00.000Z', createdBy: 'Imke Vale' },
  ...{ endsAt: '2026-04-30T22:00:00.000Z', revokedAt: null, openedAt: null },
};
const link = 'https://mill.example/client#secret-of-the-link';

async function open(items: unknown[] = [], more: { state?: string; isSure?: boolean } = {}) {
  const { state = 'issued', isSure = true } = more;
  const sent = jest.fn();
  const widget = await OpenedWidget.open(IssueSending, {
    inputs: { issue: { ...issue, state }, jobId: id(11), sent },
    ...{ roles: ['office'], isSure },
    providers: [{ provide: NOW, useValue: () => new Date('2026-03-10T10:00:00.000Z') }],
  });
  await widget.answer(listed, { items });
  return { widget, sent };
}

describe('IssueSending', () => {
  it('sends the link until the issue’s last day with a word beside it, says so, and lets the issue follow', async () => {
    const { widget, sent } = await open();
    await widget.enter('note', 'As we said on Monday.');
    await widget.press('Send it to the client');
    const request = widget.http.expectOne({ method: 'POST', url: given });
    expect(request.request.body).toEqual({ endsOn: '2026-04-30', send: true, note: 'As we said on Monday.' });
    request.flush({ access, link });
    await widget.settle();
    await widget.answer(listed, { items: [access] });
    expect(sent).toHaveBeenCalledTimes(1);
    expect(TestBed.inject(Notices).current()[0]?.text).toBe('The letter is on its way.');
    expect(widget.text).toContain('not opened yet, works until 30 Apr');
  });

  it('makes a link to be passed on by hand, shows it once, and copies it', async () => {
    const { widget } = await open();
    widget.entry('send').click();
    await widget.settle();
    expect(widget.element.querySelector('[formcontrolname=note]')).toBeNull();
    await widget.press('Make the link');
    await widget.answer(given, { access, link }, 'POST');
    await widget.answer(listed, { items: [access] });
    expect(widget.element.querySelector('.link')?.textContent).toBe(link);
    expect(widget.element.querySelector('ul')?.textContent).not.toContain('secret');
    const copied: string[] = [];
    Object.defineProperty(globalThis.navigator, 'clipboard', {
      ...{ configurable: true },
      value: { writeText: (text: string) => Promise.resolve(void copied.push(text)) },
    });
    await widget.press('Copy it');
    expect([copied, widget.button('Copied')?.type]).toEqual([[link], 'button']);
  });

  it('leaves the link to be copied by hand where the browser does not let it', async () => {
    const { widget } = await open();
    await widget.press('Send it to the client');
    await widget.answer(given, { access, link }, 'POST');
    await widget.answer(listed, { items: [access] });
    Object.defineProperty(globalThis.navigator, 'clipboard', {
      ...{ configurable: true },
      value: { writeText: () => Promise.reject(new DOMException('denied', 'NotAllowedError')) },
    });
    await widget.press('Copy it');
    expect(widget.button('Copied')).toBeUndefined();
    expect(
      TestBed.inject(Notices)
        .current()
        .some(({ text }) => text.includes('by hand')),
    ).toBe(true);
  });

  it('says beside the form why nothing could be sent', async () => {
    const { widget } = await open();
    await widget.press('Send it to the client');
    await widget.refuse(given, 409, 'No e-mail address is kept for Helena Marsh.');
    expect(widget.text).toContain('No e-mail address is kept for Helena Marsh.');
    expect(widget.element.querySelector('.link')).toBeNull();
  });

  it('tells of each link whether it was opened, has ended or was taken back, and hides those of signing in', async () => {
    const { widget } = await open([
      { ...access, id: id(21), openedAt: '2026-03-02T09:00:00.000Z' },
      { ...access, id: id(22), endsAt: '2026-03-05T09:00:00.000Z' },
      { ...access, id: id(23), revokedAt: '2026-03-04T09:00:00.000Z' },
      { ...access, id: id(24), purpose: 'sign-in' },
    ]);
    const states = [...widget.element.querySelectorAll('li .muted')].map(({ textContent }) => textContent);
    expect(states).toEqual(['opened on 2 Mar, works until 30 Apr', 'ended on 5 Mar 2026', 'taken back on 4 Mar 2026']);
    expect(widget.element.querySelectorAll('li button')).toHaveLength(1);
  });

  it('takes a link back once somebody is sure', async () => {
    const { widget } = await open([access]);
    await widget.press('Take it back');
    await widget.answer(`/api/accesses/${id(20)}`, null, 'DELETE');
    await widget.answer(listed, { items: [{ ...access, revokedAt: '2026-03-10T10:00:00.000Z' }] });
    expect(widget.button('Take it back')).toBeUndefined();
  });

  it('leaves it where somebody thinks better of it', async () => {
    const { widget } = await open([access], { isSure: false });
    await widget.press('Take it back');
    widget.http.expectNone(`/api/accesses/${id(20)}`);
    expect(widget.button('Take it back')).toBeDefined();
  });

  it.each(['accepted', 'declined', 'replaced'])('sends nothing of an issue that is %s', async (state) => {
    const { widget } = await open([access], { state });
    expect([widget.element.querySelector('form'), widget.button('Take it back')?.type]).toEqual([null, 'button']);
  });
});
