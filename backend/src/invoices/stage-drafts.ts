import type { Contract, ContractPart } from '#shared/agreements/contract';
import { buyerOf } from '#shared/invoices/buyer-of';
import { restRounding, type CreditedRest } from '#shared/invoices/credited-rest';
import { claimRounding } from '#shared/invoices/contract-account';
import type { InvoiceContent } from '#shared/invoices/invoice';
import { claimedAmounts, type ClaimedAmount, type PlannedClaim } from '#shared/invoices/stage-claim';
import { stageLines, type StageLineNames } from '#shared/invoices/stage-lines';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import type { TaxableAmount } from '#shared/money/tax-by-category';
import type { InvoiceRow } from './invoice-model';
import { wordsOf, type InvoiceParts } from './invoice-parts';
import { againNames, shortened, stageNames, takenAwayNames } from './stage-names';

/** A part of a workshop's contract, of which something is claimed. */
export interface Claimed {
  readonly workshopId: string;
  readonly contract: Contract;
  readonly part: ContractPart;
}

/** What a first draft holds, and the rounding that is known of it. */
export interface StageDraft {
  readonly content: InvoiceContent;
  readonly known_minor: MinorUnits;
}

const asWork = ({ tax, net_minor }: TaxableAmount): ClaimedAmount => ({
  ...{ tax, work_minor: net_minor, recovered_minor: 0, retained_minor: 0 },
});

const givenBack = ({ tax, work_minor, recovered_minor, retained_minor }: ClaimedAmount): ClaimedAmount => ({
  ...{ tax, work_minor: -work_minor, recovered_minor: -recovered_minor, retained_minor: -retained_minor },
});

/** First drafts of what is claimed of a contract: invoices of its plan and of what was credited, credit notes of what is taken away. */
export class StageDrafts {
  constructor(private readonly parts: InvoiceParts) {}

  async planned(claimed: Claimed, claim: PlannedClaim): Promise<StageDraft> {
    const { workshopId, part } = claimed;
    const names = stageNames(await wordsOf(this.parts, workshopId), part, claim);
    const content = await this.content(claimed, claimedAmounts(part, claim), names);
    return { content, known_minor: claimRounding(part, claim) };
  }

  async again(claimed: Claimed, rest: CreditedRest, number: string): Promise<StageDraft> {
    const names = againNames(await wordsOf(this.parts, claimed.workshopId), claimed.part, number);
    return { content: await this.content(claimed, rest.nets.map(asWork), names), known_minor: restRounding(rest) };
  }

  /** A credit note against an invoice of the job, to whomever that went. */
  async takenAway(claimed: Claimed, claim: PlannedClaim, { content: { buyer } }: InvoiceRow): Promise<StageDraft> {
    const { workshopId, part } = claimed;
    const words = await wordsOf(this.parts, workshopId);
    const amounts = claimedAmounts(part, claim).map(givenBack);
    const content = await this.content(claimed, amounts, takenAwayNames(words, part));
    const terms = words.say('invoice-credit-terms');
    return { content: { ...content, buyer, terms }, known_minor: -claimRounding(part, claim) };
  }

  private async content(
    { workshopId, contract, part }: Claimed,
    amounts: readonly ClaimedAmount[],
    names: StageLineNames,
  ): Promise<InvoiceContent> {
    const client = await this.parts.jobs.client(workshopId, contract.clientId);
    const workshop = await this.parts.workshops.get(workshopId);
    const { terms } = await this.parts.settings.read(workshopId);
    return {
      ...{ clientId: contract.clientId, jobId: contract.jobId, buyer: buyerOf(client, workshop.country) },
      ...{ pricesHold: 'net', allowancesCharges: [], roundsToCash: false, note: '' },
      ...{ deliveredOn: null, period: null, dueOn: null, terms },
      exemptions: part.exemptions.map(({ code, reason }) => ({ code, reasonCode: '', reason: shortened(reason, 300) })),
      lines: stageLines(amounts, names, currencyDigits(contract.currency)),
    };
  }
}
