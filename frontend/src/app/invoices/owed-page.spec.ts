import type { OwedInCurrency } from '#shared/invoices/payment-schema';
import { BooksVisit, invoiceId } from '../../test/sample-invoices';
import { OwedPage } from './owed-page';

const ages = { 'not-due': 0, 'to-30': 0, 'to-60': 0, 'to-90': 0, 'over-90': 0 };
const euro: OwedInCurrency = {
  currency: 'EUR',
  items: [
    {
      ...{ clientId: invoiceId(90), clientName: 'Ashgrove House', open_minor: 150_00, credit_minor: 0 },
      byAge_minor: { ...ages, 'not-due': 100_00, 'to-60': 50_00 },
    },
    {
      ...{ clientId: invoiceId(91), clientName: 'Quay Museum', open_minor: 20_00, credit_minor: 7_00 },
      byAge_minor: { ...ages, 'over-90': 20_00 },
    },
  ],
  open_minor: 170_00,
};
const crowns: OwedInCurrency = {
  currency: 'SEK',
  items: [
    {
      ...{ clientId: invoiceId(90), clientName: 'Ashgrove House', open_minor: 900_00, credit_minor: 0 },
      byAge_minor: { ...ages, 'not-due': 900_00 },
    },
  ],
  open_minor: 900_00,
};

const begin = () => BooksVisit.begin(OwedPage, { path: 'accounts', address: '/accounts' });
const shown = async (currencies: readonly OwedInCurrency[]) => {
  const visit = await begin();
  await visit.answer('GET', '/api/owed', { day: '2026-03-20', currencies });
  return visit;
};
const cells = (row: Element) => [...row.children].map((cell) => (cell.textContent ?? '').replace(/\s+/g, ' ').trim());

describe('OwedPage', () => {
  it('adds up each column, says what of it is overdue, and leads from a client to their statement', async () => {
    const visit = await shown([euro]);
    for (const text of ['€170.00', 'of it overdue€70.00', 'to clients’ credit€7.00'])
      expect(visit.text).toContain(text);
    const [foot] = visit.element.querySelectorAll('tfoot tr');
    expect(cells(foot)).toEqual(['Together', '100.00', '', '50.00', '', '20.00', '€170.00', '7.00']);
    const [first] = visit.element.querySelectorAll('tbody tr');
    expect(first.querySelector('a')?.getAttribute('href')).toBe(`/accounts/clients/${invoiceId(90)}`);
    expect(visit.element.querySelectorAll('h2')).toHaveLength(0);
  });

  it('never adds one currency to another: each has its name, its table and its sum', async () => {
    const visit = await shown([euro, crowns]);
    expect([...visit.element.querySelectorAll('h2')].map((one) => one.textContent)).toEqual(['In EUR', 'In SEK']);
    const feet = [...visit.element.querySelectorAll('tfoot tr')].map((foot) => cells(foot)[6]);
    expect(feet).toEqual(['€170.00', expect.stringMatching(/SEK\s?900\.00/)]);
    expect(visit.text).not.toContain('1,070.00');
  });

  it('says that nothing is owed', async () => {
    expect((await shown([])).text).toContain('Nothing is owed');
  });

  it('asks again where the list did not come', async () => {
    const visit = await begin();
    await visit.refuse('GET', '/api/owed', { status: 500 });
    expect(visit.text).toContain('The list did not come');
    await visit.press('Ask again');
    await visit.answer('GET', '/api/owed', { day: '2026-03-20', currencies: [euro] });
    expect(visit.text).toContain('Ashgrove House');
  });
});
