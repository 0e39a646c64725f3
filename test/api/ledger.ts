import type { ContractPart } from '#shared/agreements/contract';
import { claimedDue, type PlannedClaim } from '#shared/invoices/stage-claim';
import { cumulativePercents } from '#shared/money/cumulative-parts';
import type { App } from '../../backend/src/app';
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

interface AgreedPart {
  readonly workshopId: string;
  readonly jobId: string;
  readonly issueId: string;
  readonly gross: number;
  readonly standing: number;
  readonly drafts: number;
}

const agreedParts = `
  SELECT s.workshop_id AS workshopId, e.job_id AS jobId, s.id AS issueId, COALESCE(d.gross_minor, s.gross_minor) AS gross,
    CAST(COALESCE(SUM(CASE
      WHEN i.state <> 'issued' THEN 0
      WHEN i.kind = 'credit-note' THEN -i.due_minor
      ELSE i.due_minor - COALESCE((SELECT SUM(c.due_minor) FROM invoices c WHERE c.workshop_id = i.workshop_id
        AND c.credited_invoice_id = i.id AND c.state = 'issued' AND c.claim_issue_id IS NULL), 0)
    END), 0) AS SIGNED) AS standing,
    CAST(COALESCE(SUM(i.state = 'draft'), 0) AS SIGNED) AS drafts
  FROM issues s
  JOIN estimates e ON e.workshop_id = s.workshop_id AND e.id = s.estimate_id
  LEFT JOIN decisions d ON d.workshop_id = s.workshop_id AND d.issue_id = s.id
  LEFT JOIN invoices i ON i.workshop_id = s.workshop_id AND i.claim_issue_id = s.id
  WHERE s.state = 'accepted'
  GROUP BY s.workshop_id, e.job_id, s.id, d.gross_minor, s.gross_minor`;

/** What the plan of a part foresees, with tax: the deposit, every stage by itself, and both releases of what is held back. */
function foreseen(part: ContractPart): number {
  const ends = ['0', ...cumulativePercents(part.plan.stages_percent).map(String)];
  const stages = ends
    .slice(1)
    .map((to_percent, place): PlannedClaim => ({ of: 'work', from_percent: ends[place], to_percent }));
  const claims: PlannedClaim[] = [{ of: 'deposit' }, ...stages, { of: 'first-release' }, { of: 'second-release' }];
  return claims.reduce((sum, claim) => sum + claimedDue(part, claim), 0);
}

/**
 * What contracts and their invoices say that does not agree: of every accepted part, its gross = deposit + stages + retention as its plan
 * foresees them = invoiced − credited + what its account says is left, where credit notes of what a variation takes away count with the variation; where no claim is open or drafted, and wherever the
 * account calls it complete, nothing is left; and no contract is below nothing.
 */
export async function contractFaults(app: App, database: Database): Promise<string[]> {
  const agreed = await database.select<AgreedPart>(agreedParts);
  const accounts = new Map<string, Awaited<ReturnType<App['invoices']['stages']['account']>>>();
  const plans = new Map<string, ContractPart>();
  for (const { workshopId, jobId } of agreed) {
    if (accounts.has(jobId)) continue;
    accounts.set(jobId, await app.invoices.stages.account(workshopId, jobId));
    const contract = await app.agreements.contracts.contract(workshopId, jobId);
    for (const part of contract?.parts ?? []) plans.set(part.issueId, part);
  }
  const below = [...accounts].filter(([, account]) => (account?.gross_minor ?? 0) < 0).map(([jobId]) => jobId);
  const faults = agreed.flatMap(({ jobId, issueId, ...one }) => {
    const part = accounts.get(jobId)?.parts.find((among) => among.issueId === issueId);
    const plan = plans.get(issueId);
    if (!part || !plan) return [`the accepted issue ${issueId} is no part of the contract of its job`];
    const left = Number(one.gross) - Number(one.standing);
    const isDone = part.next.length === 0 && Number(one.drafts) === 0;
    const planned = foreseen(plan);
    return [
      ...(planned === Number(one.gross) ? [] : [`the plan of ${issueId} comes to ${planned}, not ${one.gross}`]),
      ...(left === part.left_minor ? [] : [`of ${issueId} ${left} is left, not ${part.left_minor}`]),
      ...((isDone || part.isComplete) && left !== 0 ? [`all of ${issueId} is invoiced, but for ${left}`] : []),
      ...(isDone === part.isComplete ? [] : [`${issueId} is ${part.isComplete ? '' : 'not '}called complete`]),
    ];
  });
  return [...faults, ...below.map((jobId) => `the contract of ${jobId} is below nothing`)];
}
