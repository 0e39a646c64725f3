import { contractFaults, ledgerFaults } from '../api/ledger';
import { ublFaults } from '../reference/ubl-check';
import { seededDemonstration, type SeededDemonstration } from './seeded-demonstration';

let seeded: SeededDemonstration;
beforeAll(async () => {
  seeded = await seededDemonstration();
}, 120_000);
afterAll(() => seeded.stop());

const invoicesOf = async () => (await seeded.app.invoices.reading.page(seeded.workshopId, { limit: 50 })).items;

describe('The books of the demonstration', () => {
  it('agree to the cent', async () => {
    expect(await ledgerFaults(seeded.platform.database)).toEqual([]);
    expect(await contractFaults(seeded.app, seeded.platform.database)).toEqual([]);
  });

  it('hold a repair that is overdue, a deposit that was paid and a stage that is open', async () => {
    const standing = (await invoicesOf()).map(({ isOverdue, due_minor, open_minor }) =>
      isOverdue ? 'overdue' : open_minor === 0 ? 'paid' : open_minor === due_minor ? 'open' : 'in part',
    );
    expect(standing.sort()).toEqual(['open', 'overdue', 'paid']);
  });

  it('have papers that agree with themselves', async () => {
    for (const { id } of await invoicesOf()) {
      const { bytes } = await seeded.app.invoices.reading.paper(seeded.workshopId, id, 'invoice.xml');
      expect(ublFaults(bytes.toString('utf8'))).toEqual([]);
    }
  });
});
