import fc from 'fast-check';
import type { Contract, ContractPart } from '#shared/agreements/contract';
import {
  claimRounding,
  claimTotals,
  contractAccount,
  isClaiming,
  partAccount,
  type ClaimingInvoice,
} from '#shared/invoices/contract-account';
import { claimedAmounts, type StageClaim } from '#shared/invoices/stage-claim';
import { stagePayments } from '#shared/money/stage-payments';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory } from '#shared/money/tax-by-category';

const partOf = (nets: readonly (readonly [string, number])[], plan: ContractPart['plan']): ContractPart => {
  const taxed = taxByCategory(nets.map(([percent, net_minor]) => ({ tax: { code: 'S', percent }, net_minor })));
  return {
    ...{ issueId: 'issue', estimateId: 'estimate', kind: 'estimate', number: '2026-001 A', title: 'Pier table' },
    ...{
      acceptedOn: '2026-03-02',
      choice: [],
      plan,
      stageNames: plan.stages_percent.map((_, at) => `Stage ${at + 1}`),
    },
    ...{ taxes: taxed.categories, net_minor: taxed.net_minor, tax_minor: taxed.tax_minor },
    gross_minor: taxed.gross_minor,
  };
};

const plan = { deposit_percent: 30, stages_percent: [40, 40, 20], retention_percent: 5 };
const part = partOf([['20', 1_000_00]], plan);
const work = (from_percent: string, to_percent: string): StageClaim => ({ of: 'work', from_percent, to_percent });

const issuedFor = (one: ContractPart, claim: StageClaim, before: readonly ClaimingInvoice[]): ClaimingInvoice => ({
  ...{ invoiceId: `invoice ${before.length}`, issueId: one.issueId, claim, isIssued: true, credited_minor: 0 },
  due_minor: claimTotals(one, claim).gross_minor + claimRounding(one, claim, before),
});

/** Invoices whatever is offered next until nothing is left. */
function invoicedInTurn(one: ContractPart): ClaimingInvoice[] {
  const invoices: ClaimingInvoice[] = [];
  for (let step = 0; step < 40; step += 1) {
    const [next] = partAccount(one, invoices).next;
    if (!next) return invoices;
    invoices.push(issuedFor(one, next.claim, invoices));
  }
  throw new Error('the account never ends');
}

const dueOf = (invoices: readonly ClaimingInvoice[]) => sumMinor(invoices.map(({ due_minor }) => due_minor));

describe('what a claim comes to', () => {
  it('is the stage of the plan, with the deposit recovered and the retention held back', () => {
    const { stages, deposit_minor, releases_minor } = stagePayments(1_000_00, plan);
    expect(claimedAmounts(part, { of: 'deposit' })).toMatchObject([{ work_minor: deposit_minor }]);
    const [first] = claimedAmounts(part, work('0', '40'));
    expect(first).toMatchObject({ work_minor: 400_00, recovered_minor: 120_00, retained_minor: 20_00 });
    expect(first).toMatchObject({ work_minor: stages[0].work_minor, retained_minor: stages[0].retained_minor });
    expect(claimedAmounts(part, { of: 'first-release' })).toMatchObject([{ work_minor: releases_minor[0] }]);
  });

  it('is refused backwards, twice the same share, and beyond the whole', () => {
    for (const [from, to] of [
      ['40', '40'],
      ['50', '40'],
      ['0', '101'],
    ] as const)
      expect(() => claimedAmounts(part, work(from, to))).toThrow(RangeError);
  });
});

describe('where a part stands', () => {
  it('offers deposit and stages first, what was held back once all work is invoiced', () => {
    expect(partAccount(part, []).next.map(({ claim, name }) => [claim.of, name])).toEqual([
      ['deposit', ''],
      ['work', 'Stage 1'],
      ['work', 'Stage 2'],
      ['work', 'Stage 3'],
    ]);
    const all = [issuedFor(part, work('0', '100'), [])];
    expect(partAccount(part, all).next.map(({ claim }) => claim.of)).toEqual([
      'deposit',
      'first-release',
      'second-release',
    ]);
  });

  it('takes a valuation of the share done in place of planned stages, and leaves the rest of the stage it ends in', () => {
    const done = [issuedFor(part, work('0', '55'), [])];
    expect(
      partAccount(part, done)
        .next.map(({ claim }) => claim)
        .slice(1),
    ).toEqual([work('55', '80'), work('80', '100')]);
  });

  it('claims again what was credited to the last cent, and not what was credited in part', () => {
    const first = issuedFor(part, work('0', '40'), []);
    const inPart = { ...first, credited_minor: 1 };
    const wholly = { ...first, credited_minor: first.due_minor };
    expect(isClaiming(inPart)).toBe(true);
    expect(partAccount(part, [inPart]).next[1].claim).toEqual(work('40', '80'));
    expect(partAccount(part, [wholly]).next[1].claim).toEqual(work('0', '40'));
    expect(partAccount(part, [wholly]).left_minor).toBe(part.gross_minor);
  });

  it('counts a draft as claiming, though nothing is invoiced yet', () => {
    const draft = { ...issuedFor(part, { of: 'deposit' }, []), isIssued: false };
    const account = partAccount(part, [draft]);
    expect(account.next[0].claim.of).toBe('work');
    expect(account).toMatchObject({ invoiced_minor: 0, left_minor: 1_200_00, isComplete: false });
  });
});

describe('the contract and its invoices', () => {
  it('agree to the cent where taxes of single invoices do not: 0.05 at 10 % in tenths', () => {
    const small = partOf([['10', 5]], {
      deposit_percent: 0,
      stages_percent: [20, 20, 20, 20, 20],
      retention_percent: 0,
    });
    const invoices = invoicedInTurn(small);
    expect(small.gross_minor).toBe(6);
    expect(invoices.map(({ due_minor }) => due_minor)).toEqual([1, 1, 1, 1, 2]);
  });

  it('agree in whatever plan, taxes and order: deposit + stages + releases are the contract', () => {
    const nets = fc.array(fc.tuple(fc.constantFrom('20', '10', '7.7'), fc.integer({ min: -5_000, max: 9_000_000 })), {
      minLength: 1,
      maxLength: 3,
    });
    const plans = fc.record({
      deposit_percent: fc.integer({ min: 0, max: 50 }),
      retention_percent: fc.integer({ min: 0, max: 20 }),
      stages_percent: fc.constantFrom([100], [40, 40, 20], [33.3, 33.3, 33.4], [1, 99]),
    });
    fc.assert(
      fc.property(nets, plans, (categories, chosen) => {
        const any = partOf(categories, chosen);
        const invoices = invoicedInTurn(any);
        expect(dueOf(invoices)).toBe(any.gross_minor);
        const account = contractAccount(
          { gross_minor: any.gross_minor, parts: [any] } as unknown as Contract,
          invoices,
        );
        expect(account).toMatchObject({ invoiced_minor: any.gross_minor, left_minor: 0 });
        expect(account.parts[0].isComplete).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('agree again after one of them was credited wholly and invoiced anew', () => {
    const invoices = invoicedInTurn(part);
    const [, stage] = invoices;
    const credited = invoices.map((one) => (one === stage ? { ...one, credited_minor: one.due_minor } : one));
    const anew = issuedFor(part, stage.claim, credited);
    expect(dueOf([...credited, anew]) - stage.due_minor).toBe(part.gross_minor);
  });
});
