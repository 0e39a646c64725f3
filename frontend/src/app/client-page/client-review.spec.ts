import { clientPrice, ClientVisit, offered } from '../../test/client-issue';

const sha256 = 'ab'.repeat(32);
const refused = (status: number, title: string) => ({ type: 'about:blank', title, status, instance: '', errors: [] });

async function reviewing(more: Parameters<typeof clientPrice>[1] = {}): Promise<ClientVisit> {
  const visit = await ClientVisit.begin();
  await visit.choose('Oil gilding');
  visit.asked('prices').flush(clientPrice(5_535_00, { choice: [offered.oil] }));
  await visit.settle();
  await visit.press('Review');
  const request = visit.asked('review');
  expect(request.request.body).toEqual({ choice: [offered.oil] });
  request.flush({ price: clientPrice(5_535_00, { ...more, choice: [offered.oil] }), pdfSha256: sha256 });
  await visit.settle();
  return visit;
}

describe('The last look before accepting', () => {
  it('shows what was chosen, what it comes to, what is paid first, and the very paper', async () => {
    const visit = await reviewing();
    const paper = visit.element.querySelector('app-client-review a');
    expect(paper?.getAttribute('href')).toMatch(new RegExp(`/estimate\\.pdf\\?choice=${offered.oil}$`));
    for (const text of ['Oil gilding', '€5,535.00', 'The first payment is €2,460.00', sha256])
      expect(visit.text).toContain(text);
    expect(visit.element.querySelector('.bar')).toBeNull();
    expect(visit.element.ownerDocument.activeElement?.textContent).toBe('Before you accept');
  });

  const namesOf = ({ element }: ClientVisit) =>
    [...element.querySelectorAll('app-client-review dt')].map(({ textContent }) => textContent?.trim());

  it('tells net and tax where there may be tax', async () => {
    expect(namesOf(await reviewing()).slice(-3)).toEqual(['Net', 'Tax', 'Total']);
  });

  it('tells the total alone where nothing is taxed', async () => {
    const taxes = clientPrice(5_535_00).taxes.map((tax) => ({ ...tax, code: 'O' as const, percent: '0' }));
    const names = namesOf(await reviewing({ taxes }));
    expect(names).toContain('Total');
    expect(names).not.toContain('Net');
    expect(names).not.toContain('Tax');
  });

  it('sends nothing without a name and a tick, and says what is missing', async () => {
    const visit = await reviewing();
    await visit.press('Accept');
    visit.http.expectNone((request) => request.url.endsWith('/acceptance'));
    expect(visit.element.querySelectorAll('app-client-review p[role=alert]')).toHaveLength(2);
    expect(visit.text).toContain('Please tick that you accept.');
  });

  it('accepts once however often it is pressed, and shows at once that it is accepted', async () => {
    const visit = await reviewing();
    await visit.enter('typedName', 'Helena Marsh');
    await visit.enter('agrees', 'yes');
    const button = visit.button('Accept');
    button?.click();
    button?.click();
    await visit.settle();
    const request = visit.asked('acceptance');
    expect(request.request.body).toEqual({
      ...{ typedName: 'Helena Marsh', agrees: true, choice: [offered.oil] },
      ...{ gross_minor: 5_535_00, pdfSha256: sha256 },
    });
    request.flush({
      ...{ kind: 'accepted', typedName: 'Helena Marsh', at: '2026-03-05T10:30:00.000Z', choice: [offered.oil] },
      ...{ reason: '', gross_minor: 5_535_00, pdfSha256: sha256 },
    });
    await visit.settle();
    visit.asked('prices').flush(clientPrice(5_535_00, { choice: [offered.oil] }));
    await visit.settle();
    expect(visit.element.querySelector('[role=status]')?.textContent).toContain('Accepted by Helena Marsh');
    expect([visit.button('Review'), visit.button('Decline this estimate')]).toEqual([undefined, undefined]);
    expect(visit.choice('Oil gilding').checked).toBe(true);
  });

  it('tries again after a lost answer under the same key', async () => {
    const visit = await reviewing();
    await visit.enter('typedName', 'Helena Marsh');
    await visit.enter('agrees', 'yes');
    await visit.press('Accept');
    const first = visit.asked('acceptance');
    first.error(new ProgressEvent('error'));
    await visit.settle();
    expect(visit.element.querySelector('app-form-complaint')?.textContent?.trim()).not.toBe('');
    await visit.press('Accept');
    const second = visit.asked('acceptance');
    const keys = [first, second].map(({ request }) => request.headers.get('idempotency-key'));
    expect(keys[0]).toMatch(/^[0-9a-f-]{36}$/);
    expect(keys[1]).toBe(keys[0]);
  });

  it('says why the server refuses, and goes back to the estimate as it stands by now, the choice kept', async () => {
    const visit = await reviewing();
    await visit.enter('typedName', 'Helena Marsh');
    await visit.enter('agrees', 'yes');
    await visit.press('Accept');
    const title = 'A later issue has taken the place of this one. Please read that one instead.';
    visit.asked('acceptance').flush(refused(409, title), { status: 409, statusText: 'Conflict' });
    await visit.settle();
    expect(visit.text).toContain(title);
    await visit.press('Back to reading it');
    visit.http.expectOne((request) => request.method === 'GET');
    expect(visit.choice('Oil gilding').checked).toBe(true);
  });

  it('offers the way back where the paper could not be made', async () => {
    const visit = await ClientVisit.begin();
    await visit.press('Review');
    visit.asked('review').flush(refused(503, 'Too much at once.'), { status: 503, statusText: 'Unavailable' });
    await visit.settle();
    expect(visit.element.querySelector('[role=alert]')?.textContent).toBe('Too much at once.');
    await visit.press('Back to reading it');
    expect(visit.element.querySelector('h1')?.textContent).toBe('Pier table');
  });
});
