import fc from 'fast-check';
import type { Contract, ContractPart } from '#shared/agreements/contract';
import { holdsTogether } from '#shared/agreements/holds-together';
import { ContractBooksForSpecs } from '#shared/invoices/contract-books-for-specs';
import { contractAccount } from '#shared/invoices/contract-account';
import { fittingClaim } from '#shared/invoices/fitting-claim';
import { claimedDue } from '#shared/invoices/stage-claim';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, type TaxRate } from '#shared/money/tax-by-category';

const rates: readonly TaxRate[] = [
  { code: 'S', percent: '20' },
  { code: 'S', percent: '7.7' },
  { code: 'E', percent: '0' },
];
const whole = { deposit_percent: 0, stages_percent: [100], retention_percent: 0 };

/** An accepted issue with so much under each rate; what takes away has no plan of its own. */
function partOf(issueId: string, nets_minor: readonly number[], plan: ContractPart['plan'] = whole): ContractPart {
  const nets = nets_minor.map((net_minor, at) => ({ tax: rates[at], net_minor }));
  const { categories, net_minor, tax_minor, gross_minor } = taxByCategory(nets.filter((one) => one.net_minor !== 0));
  const stages = gross_minor < 0 ? whole : plan;
  return {
    ...{
      issueId,
      estimateId: issueId,
      kind: issueId === 'base' ? 'estimate' : 'variation',
      number: issueId,
      title: '',
    },
    ...{ acceptedOn: '2026-03-02', choice: [], exemptions: [], taxes: categories, plan: stages, stageNames: [] },
    ...{ net_minor, tax_minor, gross_minor },
  };
}

const anyPlan = fc.record({
  deposit_percent: fc.integer({ min: 0, max: 50 }),
  retention_percent: fc.integer({ min: 0, max: 20 }),
  stages_percent: fc.constantFrom([100], [40, 40, 20], [33.3, 33.3, 33.4], [1, 99]),
});
const anyNets = (min: number, max: number) =>
  fc.tuple(fc.integer({ min, max }), fc.integer({ min, max }), fc.integer({ min, max }));
/** What is done to the books: the next claim of some part is raised, or something of some invoice is credited. */
const anyDeed = fc.record({
  at: fc.nat({ max: 30 }),
  credits: fc.constantFrom('nothing', 'nothing', 'some', 'all'),
  net_minor: fc.integer({ min: 1, max: 40_000 }),
});

function agreed(base: ContractPart, varied: readonly ContractPart[]): ContractPart[] {
  return varied.reduce<ContractPart[]>(
    (parts, one) => (holdsTogether([...parts, one]) ? [...parts, one] : parts),
    [base],
  );
}

function raiseAll(books: ContractBooksForSpecs): void {
  for (let step = 0; step < 200; step += 1) {
    const open = books.parts.flatMap((part) => books.next(part).map((claim) => ({ part, claim })));
    if (open.length === 0) return;
    if (!open.some(({ part, claim }) => books.claim(part, claim)))
      throw new Error('what is taken away finds no invoice');
  }
  throw new Error('the account never ends');
}

const lawful = (
  parts: readonly ContractPart[],
  deeds: readonly { at: number; credits: string; net_minor: number }[],
) => {
  const books = new ContractBooksForSpecs(parts);
  for (const { at, credits, net_minor } of deeds) {
    const part = parts[at % parts.length];
    const next = books.next(part);
    const place = at % Math.max(1, books.invoices.length);
    if (credits === 'all' && books.invoices.length > 0) books.creditWhole(place);
    else if (credits === 'some' && books.invoices.length > 0) books.credit(place, net_minor);
    else if (next.length > 0) books.claim(part, next[at % next.length]);
  }
  raiseAll(books);
  return books;
};

describe('a contract of which variations take away', () => {
  it('is invoiced, credited and claimed again to the cent, whatever is done in whatever order', () => {
    const anyVaried = fc.array(fc.tuple(anyNets(-60_000, 40_000), anyPlan), { maxLength: 4 });
    fc.assert(
      fc.property(
        anyNets(0, 200_000),
        anyPlan,
        anyVaried,
        fc.array(anyDeed, { maxLength: 25 }),
        (nets, plan, varied, deeds) => {
          const changes = varied.map(([own, ownPlan], at) => partOf(`variation ${at + 1}`, own, ownPlan));
          const parts = agreed(partOf('base', nets, plan), changes);
          const gross_minor = sumMinor(parts.map((part) => part.gross_minor));
          const books = lawful(parts, deeds);
          expect(books.standing_minor).toBe(gross_minor);
          for (const one of books.invoices) {
            expect(one.invoice.due_minor).toBeGreaterThanOrEqual(0);
            expect(books.room_minor(one)).toBeGreaterThanOrEqual(0);
          }
          const account = contractAccount({ gross_minor, parts } as unknown as Contract, books.claims);
          expect(account).toMatchObject({ gross_minor, left_minor: 0 });
          expect(account.parts.every(({ isComplete }) => isComplete)).toBe(true);
        },
      ),
      { numRuns: 300 },
    );
  });

  it('has no stage below nothing: what was taken away is credited against invoices, the newest first', () => {
    const base = partOf('base', [1_000_00, 0, 0], {
      deposit_percent: 30,
      stages_percent: [50, 50],
      retention_percent: 0,
    });
    const plain = partOf('variation', [-420_00, 0, 0]);
    const books = new ContractBooksForSpecs([base, plain]);
    const [taken] = books.next(plain);
    expect(books.claim(plain, taken)).toBe(false);
    books.claim(base, { of: 'deposit' });
    expect(books.claim(plain, taken)).toBe(true);
    // The deposit of 360.00 takes that much of 504.00; what is left of it waits for the next invoice.
    expect(books.next(plain)).toEqual([{ of: 'work', from_percent: '71.428571', to_percent: '100' }]);
    raiseAll(books);
    expect(books.standing_minor).toBe(1_200_00 - 504_00);
  });
});

describe('as much of what is taken away as an invoice has room for', () => {
  it('is never more, and all of it where it fits', () => {
    fc.assert(
      fc.property(anyNets(-90_000, 20_000), fc.integer({ min: 1, max: 120_000 }), (nets, room_minor) => {
        const part = partOf('variation', nets);
        fc.pre(part.gross_minor < 0);
        const claim = { of: 'work', from_percent: '0', to_percent: '100' } as const;
        const fitting = fittingClaim(part, claim, room_minor);
        const given_minor = fitting ? -claimedDue(part, fitting) : 0;
        expect(given_minor).toBeLessThanOrEqual(room_minor);
        // Shares of a hundred millionth leave at most a minor unit over at these sums.
        expect(Math.min(room_minor, -part.gross_minor) - given_minor).toBeLessThanOrEqual(1);
      }),
    );
  });
});

describe('parts of a contract', () => {
  it('hold together as long as nothing under any tax is below nothing', () => {
    const base = partOf('base', [100_00, 50_00, 0]);
    expect(holdsTogether([base, partOf('variation', [-100_00, 0, 0])])).toBe(true);
    expect(holdsTogether([base, partOf('variation', [-100_01, 0, 0])])).toBe(false);
    expect(holdsTogether([base, partOf('variation', [-100_00, -50_00, 0])])).toBe(true);
    // Not even where the other taxes make up for it: what was never charged under a tax cannot be given back under it.
    expect(holdsTogether([base, partOf('variation', [0, 0, -1])])).toBe(false);
  });
});
