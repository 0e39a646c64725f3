import type { Database } from '../../backend/src/platform/database/database';

interface Sums {
  readonly workshopId: string;
  readonly currency: string;
  readonly due: number;
  readonly credited: number;
  readonly paid: number;
  readonly writtenOff: number;
  readonly open: number;
  readonly credit: number;
}

const sums = `
  SELECT workshopId, currency, CAST(SUM(due) AS SIGNED) AS due, CAST(SUM(credited) AS SIGNED) AS credited,
    CAST(SUM(paid) AS SIGNED) AS paid, CAST(SUM(writtenOff) AS SIGNED) AS writtenOff, CAST(SUM(open) AS SIGNED) AS open,
    CAST(SUM(credit) AS SIGNED) AS credit
  FROM (
    SELECT workshop_id AS workshopId, currency, IF(kind = 'invoice', due_minor, 0) AS due, IF(kind = 'credit-note', due_minor, 0) AS credited,
      0 AS paid, 0 AS writtenOff, open_minor AS open, 0 AS credit FROM invoices WHERE state = 'issued'
    UNION ALL SELECT workshop_id, currency, 0, 0, amount_minor, 0, 0, credit_minor FROM payments
    UNION ALL SELECT w.workshop_id, i.currency, 0, 0, 0, w.amount_minor, 0, 0
      FROM write_offs w JOIN invoices i ON i.workshop_id = w.workshop_id AND i.id = w.invoice_id
  ) AS moved GROUP BY workshopId, currency`;

const singly = `
  SELECT i.number AS name, i.due_minor - i.credited_minor - i.open_minor
    - COALESCE((SELECT SUM(s.amount_minor) FROM payment_shares s WHERE s.workshop_id = i.workshop_id AND s.invoice_id = i.id), 0)
    - COALESCE((SELECT SUM(w.amount_minor) FROM write_offs w WHERE w.workshop_id = i.workshop_id AND w.invoice_id = i.id), 0) AS off
  FROM invoices i WHERE i.state = 'issued' AND i.kind = 'invoice' HAVING off <> 0
  UNION ALL
  SELECT i.number, i.credited_minor - COALESCE((SELECT SUM(c.due_minor) FROM invoices c
    WHERE c.workshop_id = i.workshop_id AND c.credited_invoice_id = i.id AND c.state = 'issued'), 0) AS off
  FROM invoices i WHERE i.state = 'issued' AND i.kind = 'invoice' HAVING off <> 0
  UNION ALL
  SELECT p.id, p.amount_minor - p.credit_minor
    - COALESCE((SELECT SUM(s.amount_minor) FROM payment_shares s WHERE s.workshop_id = p.workshop_id AND s.payment_id = p.id), 0)
    + COALESCE((SELECT SUM(r.amount_minor) FROM payments r WHERE r.workshop_id = p.workshop_id AND r.refunds_payment_id = p.id), 0) AS off
  FROM payments p WHERE p.refunds_payment_id IS NULL HAVING off <> 0`;

const numbers = `
  SELECT workshop_id AS workshopId, series, year, COUNT(*) AS given, COUNT(DISTINCT ordinal) AS different,
    MAX(ordinal) - MIN(ordinal) + 1 AS reach
  FROM invoices WHERE state = 'issued' GROUP BY workshop_id, series, year`;

const belowNothing = `
  SELECT number AS name FROM invoices WHERE state = 'issued' AND open_minor < 0
  UNION ALL SELECT id FROM payments WHERE credit_minor < 0`;

/**
 * What the books say that does not agree: per workshop and currency invoices − credit notes − payments − write-offs = open − credit,
 * exactly; the same of each invoice and each payment by itself; nothing open below nothing; numbers without gap or double.
 */
export async function ledgerFaults(database: Database): Promise<string[]> {
  const off = (await database.select<Sums>(sums)).filter(
    (one) => one.due - one.credited - one.paid - one.writtenOff !== one.open - one.credit,
  );
  const single = await database.select<{ name: string; off: number | string }>(singly);
  const below = await database.select<{ name: string }>(belowNothing);
  const series = await database.select<{
    series: string;
    year: number;
    given: number;
    different: number;
    reach: number;
  }>(numbers);
  const gaps = series.filter(({ given, different, reach }) => given !== different || Number(given) !== Number(reach));
  return [
    ...off.map((one) => `the books of ${one.workshopId} in ${one.currency}: ${JSON.stringify(one)}`),
    ...single.map((one) => `${one.name} is off by ${one.off}`),
    ...below.map((one) => `${one.name} stands below nothing`),
    ...gaps.map((one) => `numbers of ${one.series} ${one.year}: ${JSON.stringify(one)}`),
  ];
}
