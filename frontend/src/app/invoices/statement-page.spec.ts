import { BooksVisit, invoiceId } from '../../test/sample-invoices';
import { StatementPage } from './statement-page';

const clientId = invoiceId(90);
const statement = {
  ...{ clientName: 'Ashgrove House', from: '2026-01-01', to: '2026-12-31' },
  currencies: [{ currency: 'EUR', opening_minor: 100_00, lines: [], closing_minor: 100_00 }],
};
const address = `/api/clients/${clientId}`;

const begin = async (roles: Parameters<typeof BooksVisit.begin>[1]['roles']) => {
  const at = {
    path: 'accounts/clients/:clientId',
    address: `/accounts/clients/${clientId}?from=2026-01-01&to=2026-12-31`,
  };
  const visit = await BooksVisit.begin(StatementPage, { ...at, ...(roles ? { roles } : {}) });
  await visit.answer('GET', `${address}/statement`, statement);
  return visit;
};

describe('StatementPage', () => {
  it('mails the statement of the time that is shown, under one key however often it is pressed', async () => {
    const visit = await begin(['office']);
    expect(visit.text).toContain('€100.00');
    await visit.press('Mail it to the client');
    await visit.press('Mail the statement');
    const { request } = visit.request('POST', `${address}/statement-letters`);
    expect(request.body).toEqual({ from: '2026-01-01', to: '2026-12-31', note: '' });
    expect(request.headers.get('idempotency-key')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('is read, not mailed, by an estimator', async () => {
    const visit = await begin(['estimator']);
    expect(visit.button('Mail it to the client')).toBeUndefined();
  });
});
