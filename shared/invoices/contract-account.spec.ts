import fc from 'fast-check';
import type { Contract, ContractPart } from '#shared/agreements/contract';
import { creditedRest, restRounding } from '#shared/invoices/credited-rest';
import { isStanding, takenClaims, type ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import { claimRounding, contractAccount, partAccount } from '#shared/invoices/contract-account';
import { claimedAmounts, type PlannedClaim, type StageClaim } from '#shared/invoices/stage-claim';
import { stageLines } from '#shared/invoices/stage-lines';
import { workedInvoice } from '#shared/invoices/worked-invoice';
import { stagePayments } from '#shared/money/stage-payments';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, type TaxRate } from '#shared/money/tax-by-category';

const rateOf = (said: string): TaxRate =>
  said === 'E' || said === 'AE' ? { code: said, percent: '0' } : { code: 'S', percent: said };

/** A part with so much under each rate, or under the category E or AE. */
const partOf = (nets: readonly (readonly [string, number])[], plan: ContractPart['plan']): ContractPart => {
  const taxed = taxByCategory(nets.map(([said, net_minor]) => ({ tax: rateOf(said), net_minor })));
  return {
    ...{ issueId: 'issue', estimateId: 'estimate', kind: 'estimate', number: '2026-001 A', title: 'Pier table' },
    ...{
      acceptedOn: '2026-03-02',
      choice: [],
      plan,
      stageNames: plan.stages_percent.map((_, at) => `Stage ${at + 1}`),
    },
    ...{ taxes: taxed.categories, exemptions: [], net_minor: taxed.net_minor, tax_minor: taxed.tax_minor },
    gross_minor: taxed.gross_minor,
  };
};

const plan = { deposit_percent: 30, stages_percent: [40, 40, 20], retention_percent: 5 };
const part = partOf([['20', 1_000_00]], plan);
const work = (from_percent: string, to_percent: string): PlannedClaim => ({ of: 'work', from_percent, to_percent });

/** The invoice of a claim as the server works it: its lines, taxed by themselves, and the rounding that is known. */
const workedFor = (one: ContractPart, claim: PlannedClaim) => {
  const names = { work: 'Work', recovered: 'Deposit recovered', retained: 'Held back' };
  const lines = stageLines(claimedAmounts(one, claim), names, 2);
  const entered = { pricesHold: 'net', lines, allowancesCharges: [], roundsToCash: false } as const;
  return workedInvoice(entered, 'EUR', claimRounding(one, claim));
};

const issuedFor = (one: ContractPart, claim: PlannedClaim, before: readonly ClaimingInvoice[]): ClaimingInvoice => ({
  ...{ invoiceId: `invoice ${before.length}`, number: `26-${before.length}`, issueId: one.issueId, claim },
  ...{ isIssued: true, credited_minor: 0, credited: [], nets: [] },
  due_minor: workedFor(one, claim).totals.due_minor,
});

/** The invoice of what was credited of another and is claimed again. */
function againFor(one: ContractPart, claim: StageClaim, before: readonly ClaimingInvoice[]): ClaimingInvoice {
  if (claim.of !== 'again') return issuedFor(one, claim, before);
  const credited = before.find(({ invoiceId }) => invoiceId === claim.invoiceId);
  if (!credited) throw new Error('nothing of that kind was credited');
  const rest = creditedRest(credited, takenClaims(before));
  const { categories, gross_minor } = taxByCategory(rest.nets);
  const due_minor = gross_minor + restRounding(rest);
  return { ...issuedFor(one, { of: 'deposit' }, before), claim, due_minor, nets: categories };
}

/** The same invoice, of which a credit note over so much at one rate was issued. */
function creditedBy(one: ClaimingInvoice, net_minor: number, said = '20'): ClaimingInvoice {
  const note = taxByCategory([{ tax: rateOf(said), net_minor }]);
  const credited_minor = one.credited_minor + note.gross_minor;
  return { ...one, credited_minor, credited: [...one.credited, ...note.categories] };
}

/** Every claim the plan of a part foresees, each with the payment that paper and review promise for it. */
function promisedFor({
  gross_minor,
  plan: { stages_percent, ...held },
}: ContractPart): (readonly [PlannedClaim, number])[] {
  const { deposit_minor, stages, releases_minor } = stagePayments(gross_minor, { stages_percent, ...held });
  const ends = stages_percent.map((_, at) =>
    String(
      Math.round(stages_percent.slice(0, at + 1).reduce<number>((sum, share) => sum + Number(share) * 10, 0)) / 10,
    ),
  );
  return [
    [{ of: 'deposit' }, deposit_minor],
    ...stages.map(({ paid_minor }, at) => [work(ends[at - 1] ?? '0', ends[at]), paid_minor] as const),
    [{ of: 'first-release' }, releases_minor[0]],
    [{ of: 'second-release' }, releases_minor[1]],
  ];
}

const anyNets = fc.array(
  fc.tuple(fc.constantFrom('20', '10', '7.7', 'E', 'AE'), fc.integer({ min: -5_000, max: 9_000_000 })),
  { minLength: 1, maxLength: 4 },
);
const anyPlan = fc.record({
  deposit_percent: fc.integer({ min: 0, max: 50 }),
  retention_percent: fc.integer({ min: 0, max: 20 }),
  stages_percent: fc.constantFrom([100], [40, 40, 20], [33.3, 33.3, 33.4], [1, 99], [20, 20, 20, 20, 20]),
});

/** Invoices whatever is offered next until nothing is left. */
function invoicedInTurn(one: ContractPart): ClaimingInvoice[] {
  const invoices: ClaimingInvoice[] = [];
  for (let step = 0; step < 40; step += 1) {
    const [next] = partAccount(one, invoices).next;
    if (!next) return invoices;
    invoices.push(againFor(one, next.claim, invoices));
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

  it('offers the whole claim anew once it was credited to the last cent, and what was credited where it was in part', () => {
    const first = issuedFor(part, work('0', '40'), []);
    const inPart = creditedBy(first, 1_00);
    const wholly = { ...first, credited_minor: first.due_minor };
    expect([isStanding(inPart), isStanding(wholly)]).toEqual([true, false]);
    expect(partAccount(part, [inPart]).next[0]).toEqual({
      ...{ claim: { of: 'again', invoiceId: first.invoiceId }, name: first.number, net_minor: 1_00, gross_minor: 1_20 },
    });
    expect(partAccount(part, [inPart]).next[2].claim).toEqual(work('40', '80'));
    expect(partAccount(part, [wholly]).next[1].claim).toEqual(work('0', '40'));
    expect(partAccount(part, [wholly]).left_minor).toBe(part.gross_minor);
  });

  it('is not complete while something credited is not claimed again, and is once it was', () => {
    const invoices = invoicedInTurn(part);
    const [, stage] = invoices;
    const credited = invoices.map((one) => (one === stage ? creditedBy(one, 100_00) : one));
    expect(partAccount(part, invoices)).toMatchObject({ isComplete: true, left_minor: 0 });
    expect(partAccount(part, credited)).toMatchObject({ isComplete: false, left_minor: 120_00 });
    const again = againFor(part, { of: 'again', invoiceId: stage.invoiceId }, credited);
    expect(again.due_minor).toBe(120_00);
    expect(partAccount(part, [...credited, again])).toMatchObject({ isComplete: true, left_minor: 0, next: [] });
  });

  it('offers no whole claim beside what of it is claimed again already, but only the rest', () => {
    const first = issuedFor(part, work('0', '40'), []);
    const again = againFor(part, { of: 'again', invoiceId: first.invoiceId }, [creditedBy(first, 100_00)]);
    // All that was left of the first is credited too: 260.00 of 400.00 less deposit and retention fell due with tax.
    const wholly = { ...creditedBy(first, 100_00), credited_minor: first.due_minor };
    const [next] = partAccount(part, [wholly, { ...again, invoiceId: 'again' }]).next;
    expect(next).toMatchObject({ claim: { of: 'again' }, gross_minor: first.due_minor - again.due_minor });
  });

  it('counts a draft as claiming, though nothing is invoiced yet', () => {
    const draft = { ...issuedFor(part, { of: 'deposit' }, []), isIssued: false };
    const account = partAccount(part, [draft]);
    expect(account.next[0].claim.of).toBe('work');
    expect(account).toMatchObject({ invoiced_minor: 0, left_minor: 1_200_00, isComplete: false });
  });
});

describe('the contract and its invoices', () => {
  it('are the payments of the paper: 25,014.74 at 20 %, three tenths as deposit, 5 % held back', () => {
    const walked = partOf([['20', 25_014_74]], plan);
    expect(walked.gross_minor).toBe(30_017_69);
    // 30 % of 30,017.69 is 9,005.307; of 40 % and 80 % are paid 65 %: 7,804.60 and .60 by shares, .61 and .59 by whole cents reached.
    expect(invoicedInTurn(walked).map(({ due_minor }) => due_minor)).toEqual([
      9_005_31, 7_804_61, 7_804_59, 3_902_30, 750_44, 750_44,
    ]);
    const first = workedFor(walked, { of: 'deposit' });
    // The tax stays what it is on 7,504.42; the cent stands behind it.
    expect(first.totals).toMatchObject({ net_minor: 7_504_42, tax_minor: 1_500_88, gross_minor: 9_005_30 });
    expect(first.rounding_minor).toBe(1);
  });

  it('agree to the cent where taxes of single invoices do not: 0.05 at 10 % in fifths of 0.06', () => {
    const small = partOf([['10', 5]], {
      deposit_percent: 0,
      stages_percent: [20, 20, 20, 20, 20],
      retention_percent: 0,
    });
    const invoices = invoicedInTurn(small);
    expect(small.gross_minor).toBe(6);
    // 1.2, 2.4, 3.6, 4.8 and 6 reached, each in whole cents.
    expect(invoices.map(({ due_minor }) => due_minor)).toEqual([1, 1, 2, 1, 1]);
  });

  it('have a line even where a claim comes to nothing without its tax: 12 % of 0.04 at 25 %', () => {
    const tiny = partOf([['25', 4]], { deposit_percent: 0, stages_percent: [12, 88], retention_percent: 0 });
    const invoices = invoicedInTurn(tiny);
    expect(invoices.map(({ due_minor }) => due_minor)).toEqual([1, 4]);
    expect(workedFor(tiny, work('0', '12'))).toMatchObject({ lines: [{ price: '0.00' }], rounding_minor: 1 });
  });

  it('fall due as paper and review promise, claim by claim, whatever the contract, its taxes and its plan', () => {
    const small = fc.array(fc.tuple(fc.constantFrom('20', '25', 'E'), fc.integer({ min: -9, max: 60 })), {
      minLength: 1,
      maxLength: 3,
    });
    fc.assert(
      fc.property(fc.oneof(anyNets, small), anyPlan, (categories, chosen) => {
        const any = partOf(categories, chosen);
        const rows = promisedFor(any);
        for (const [claim, promised_minor] of rows) {
          const isNothing = claimedAmounts(any, claim).length === 0;
          expect(isNothing ? 0 : workedFor(any, claim).totals.due_minor).toBe(promised_minor);
        }
        expect(sumMinor(rows.map(([, promised_minor]) => promised_minor))).toBe(any.gross_minor);
      }),
      { numRuns: 500 },
    );
  });

  it('round by a few minor units at most: what rounding the shares and their taxes may move', () => {
    fc.assert(
      fc.property(anyNets, anyPlan, (categories, chosen) => {
        const any = partOf(categories, chosen);
        // A claim is up to six rounded amounts under each tax, and six of the gross.
        const most_minor = 7 * (any.taxes.length + 1);
        for (const [claim] of promisedFor(any))
          expect(Math.abs(claimRounding(any, claim))).toBeLessThanOrEqual(most_minor);
      }),
    );
  });

  it('agree in whatever plan, taxes and order: deposit + stages + releases are the contract', () => {
    fc.assert(
      fc.property(anyNets, anyPlan, (categories, chosen) => {
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
    const anew = againFor(part, stage.claim, credited);
    expect(dueOf([...credited, anew]) - stage.due_minor).toBe(part.gross_minor);
  });
});
