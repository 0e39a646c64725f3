import type { ContractPart } from '#shared/agreements/contract';
import { creditedRest, restRounding } from '#shared/invoices/credited-rest';
import { takenClaims, type ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import { claimRounding, partAccount } from '#shared/invoices/contract-account';
import { fittingClaim } from '#shared/invoices/fitting-claim';
import { claimedAmounts, type StageClaim } from '#shared/invoices/stage-claim';
import { stageLines } from '#shared/invoices/stage-lines';
import { workedInvoice } from '#shared/invoices/worked-invoice';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, type TaxableAmount } from '#shared/money/tax-by-category';

/** An invoice of a contract beside all that credit notes took off it, those of what was taken away included. */
interface Kept {
  readonly invoice: ClaimingInvoice;
  readonly takenAway_minor: MinorUnits;
}

const names = { work: 'Work', recovered: 'Deposit recovered', retained: 'Held back' };

/** The books of one contract in small, kept by the rules of the house: what the server does with rows, without them. */
export class ContractBooksForSpecs {
  private kept: Kept[] = [];
  private giving: ClaimingInvoice[] = [];

  constructor(readonly parts: readonly ContractPart[]) {}

  get invoices(): readonly Kept[] {
    return this.kept;
  }

  /** Everything that claims, credit notes of what is taken away with it. */
  get claims(): ClaimingInvoice[] {
    return [...this.kept.map(({ invoice }) => invoice), ...this.giving];
  }

  /** What was invoiced less all that was credited. */
  get standing_minor(): MinorUnits {
    const notes = this.kept.map(({ invoice, takenAway_minor }) => -invoice.credited_minor - takenAway_minor);
    return sumMinor([...this.kept.map(({ invoice }) => invoice.due_minor), ...notes]);
  }

  room_minor({ invoice, takenAway_minor }: Kept): MinorUnits {
    return invoice.due_minor - invoice.credited_minor - takenAway_minor;
  }

  next(part: ContractPart): readonly StageClaim[] {
    return partAccount(part, this.claims).next.map(({ claim }) => claim);
  }

  /** Whether something came of it: what is taken away needs an invoice it can be credited against. */
  claim(part: ContractPart, claim: StageClaim): boolean {
    if (part.gross_minor < 0 && claim.of === 'work') return this.giveBack(part, claim);
    const { due_minor, nets } = claim.of === 'again' ? this.again(claim.invoiceId) : this.planned(part, claim);
    this.kept.push({ invoice: { ...this.row(part, claim, due_minor), nets }, takenAway_minor: 0 });
    return true;
  }

  /** An ordinary credit note over so much without tax at the first rate of an invoice's part, as far as there is room for it. */
  credit(place: number, net_minor: MinorUnits): void {
    const one = this.kept[place];
    const part = this.parts.find(({ issueId }) => issueId === one.invoice.issueId);
    const note = taxByCategory([{ tax: part?.taxes[0].tax ?? { code: 'Z', percent: '0' }, net_minor }]);
    if (note.gross_minor <= 0 || note.gross_minor > this.room_minor(one)) return;
    const credited_minor = one.invoice.credited_minor + note.gross_minor;
    const credited = [...one.invoice.credited, ...note.categories];
    this.kept[place] = { ...one, invoice: { ...one.invoice, credited_minor, credited } };
  }

  /** An ordinary credit note over all there is room for. */
  creditWhole(place: number): void {
    const one = this.kept[place];
    const room_minor = this.room_minor(one);
    const tax = { code: 'Z', percent: '0' } as const;
    const credited = [...one.invoice.credited, { tax, net_minor: room_minor }];
    const credited_minor = one.invoice.credited_minor + room_minor;
    this.kept[place] = { ...one, invoice: { ...one.invoice, credited_minor, credited } };
  }

  private again(invoiceId: string): { due_minor: MinorUnits; nets: readonly TaxableAmount[] } {
    const taken = takenClaims(this.claims);
    const invoice = taken.find((one) => one.invoiceId === invoiceId);
    if (!invoice) throw new Error('nothing of that kind was credited');
    const rest = creditedRest(invoice, taken);
    const { categories, gross_minor } = taxByCategory(rest.nets);
    return { due_minor: sumMinor([gross_minor, restRounding(rest)]), nets: categories };
  }

  private planned(part: ContractPart, claim: Exclude<StageClaim, { of: 'again' }>) {
    const lines = stageLines(claimedAmounts(part, claim), names, 2);
    const entered = { pricesHold: 'net', lines, allowancesCharges: [], roundsToCash: false } as const;
    const { totals } = workedInvoice(entered, 'EUR', claimRounding(part, claim));
    return { due_minor: totals.due_minor, nets: [] };
  }

  private giveBack(part: ContractPart, claim: Extract<StageClaim, { of: 'work' }>): boolean {
    for (const [place, one] of [...this.kept.entries()].toReversed()) {
      const room_minor = this.room_minor(one);
      const fitting = room_minor > 0 ? fittingClaim(part, claim, room_minor) : undefined;
      if (!fitting) continue;
      const { due_minor } = this.planned(part, fitting);
      this.giving.push(this.row(part, fitting, due_minor));
      this.kept[place] = { ...one, takenAway_minor: one.takenAway_minor - due_minor };
      return true;
    }
    return false;
  }

  private row({ issueId }: ContractPart, claim: StageClaim, due_minor: MinorUnits): ClaimingInvoice {
    const place = this.kept.length + this.giving.length;
    return {
      ...{ invoiceId: `invoice ${place}`, number: `26-${place}`, issueId, claim, isIssued: true },
      ...{ due_minor, credited_minor: 0, nets: [], credited: [] },
    };
  }
}
