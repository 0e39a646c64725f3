import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { Contract, ContractPart } from '#shared/agreements/contract';
import { claimRounding, contractAccount, isClaiming, type ClaimingInvoice } from '#shared/invoices/contract-account';
import type { ContractAccountAnswer } from '#shared/invoices/contract-account-endpoints';
import { buyerOf } from '#shared/invoices/buyer-of';
import type { InvoiceContent } from '#shared/invoices/invoice';
import { claimedAmounts, type StageClaim } from '#shared/invoices/stage-claim';
import { stageLines } from '#shared/invoices/stage-lines';
import { isUncovered, type WorkSpan } from '#shared/invoices/uncovered-work';
import { currencyDigits } from '#shared/money/currency-digits';
import { D, type MinorUnits } from '#shared/money/decimal';
import { Rejection } from '#shared/problems/rejection';
import type { DraftService } from './draft-service';
import type { InvoiceRow } from './invoice-model';
import { wordsOf, type InvoiceParts } from './invoice-parts';
import type { StageDayRepository } from './stage-day-repository';
import { shortened, stageNames } from './stage-names';

interface Parts extends InvoiceParts {
  readonly drafts: DraftService;
  readonly days: StageDayRepository;
}

/** Which invoice of a stage is asked for. */
export interface StageAsked {
  readonly invoiceId: string;
  readonly issueId: string;
  readonly claim: StageClaim;
}

const claiming = (row: InvoiceRow): ClaimingInvoice[] =>
  row.claim && row.claimIssueId
    ? [
        {
          ...{ invoiceId: row.id, issueId: row.claimIssueId, claim: row.claim, isIssued: row.state === 'issued' },
          ...{ due_minor: row.dueMinor, credited_minor: row.creditedMinor },
        },
      ]
    : [];

const spanOf = (claim: StageClaim): WorkSpan[] =>
  claim.of === 'work' ? [{ from: new D(claim.from_percent), to: new D(claim.to_percent) }] : [];

/** The same claim is the same text, however its percentages were written. */
export const claimKey = (claim: StageClaim): string =>
  claim.of === 'work' ? `work ${new D(claim.from_percent).toString()} ${new D(claim.to_percent).toString()}` : claim.of;

/** Invoices out of a contract: what may be invoiced next, and the drafts of deposits, stages, valuations and releases. */
export class StageService {
  constructor(private readonly parts: Parts) {}

  async account(workshopId: string, jobId: string): Promise<ContractAccountAnswer | null> {
    await this.parts.jobs.job(workshopId, jobId);
    const contract = await this.parts.contract(workshopId, jobId);
    if (!contract) return null;
    const account = contractAccount(contract, await this.claims(workshopId, jobId));
    const days = await this.parts.days.ofIssues(
      workshopId,
      contract.parts.map(({ issueId }) => issueId),
    );
    const dayOf = (issueId: string, claim: StageClaim) =>
      days.find((day) => day.issueId === issueId && day.claimKey === claimKey(claim))?.plannedOn ?? null;
    const parts = contract.parts.map((part, place) => ({
      ...{
        issueId: part.issueId,
        kind: part.kind,
        number: part.number,
        title: part.title,
        acceptedOn: part.acceptedOn,
      },
      ...{ net_minor: part.net_minor, gross_minor: part.gross_minor },
      ...account.parts[place],
      next: account.parts[place].next.map((next) => ({ ...next, plannedOn: dayOf(part.issueId, next.claim) })),
    }));
    return { ...account, currency: contract.currency, parts };
  }

  /** Drafts the invoice of a claim that nothing claims yet; two who do so at once are let through one by one. */
  async begin(actor: Actor, jobId: string, asked: StageAsked): Promise<InvoiceRow> {
    const { workshopId } = actor;
    await this.parts.jobs.job(workshopId, jobId);
    await this.parts.settings.hold(workshopId);
    const { contract, part } = await this.partOf(workshopId, jobId, asked.issueId);
    const claims = await this.claims(workshopId, jobId);
    this.mustBeFree(part, asked.claim, claims);
    const content = await this.contentOf(workshopId, { contract, part, claim: asked.claim });
    return this.parts.drafts.add(actor, content, {
      ...{ id: asked.invoiceId, kind: 'invoice', currency: contract.currency },
      ...{ claimIssueId: part.issueId, claim: asked.claim },
      known_minor: claimRounding(part, asked.claim),
    });
  }

  /** What the invoice of a claim is rounded by, at the moment it is issued. */
  async roundingOf(row: InvoiceRow): Promise<MinorUnits> {
    if (!row.claim || !row.claimIssueId || row.jobId === null) return 0;
    const { part } = await this.partOf(row.workshopId, row.jobId, row.claimIssueId);
    return claimRounding(part, row.claim);
  }

  async plan(
    actor: Actor,
    jobId: string,
    asked: Omit<StageAsked, 'invoiceId'> & { plannedOn: string | null },
  ): Promise<void> {
    const { workshopId } = actor;
    await this.parts.jobs.job(workshopId, jobId);
    await this.partOf(workshopId, jobId, asked.issueId);
    await this.parts.days.put(workshopId, { ...asked, id: newId(), claimKey: claimKey(asked.claim) });
    const subject = { kind: 'job', id: jobId };
    await this.parts.audit.record(actor, { subject, jobId, code: 'history-stage-planned', after: asked });
  }

  private async claims(workshopId: string, jobId: string): Promise<ClaimingInvoice[]> {
    return (await this.parts.invoices.claiming(workshopId, jobId)).flatMap(claiming);
  }

  private async partOf(
    workshopId: string,
    jobId: string,
    issueId: string,
  ): Promise<{ contract: Contract; part: ContractPart }> {
    const contract = await this.parts.contract(workshopId, jobId);
    if (!contract) throw new Rejection('conflict', 'invoice-no-contract');
    const part = contract.parts.find((one) => one.issueId === issueId);
    if (!part) throw new Rejection('not-found', 'invoice-claim-unknown');
    return { contract, part };
  }

  private mustBeFree(part: ContractPart, claim: StageClaim, claims: readonly ClaimingInvoice[]): void {
    const own = claims.filter((one) => one.issueId === part.issueId && isClaiming(one));
    const spans = own.flatMap((one) => spanOf(one.claim));
    const [asked] = spanOf(claim);
    const { next } = contractAccount({ parts: [part] } as unknown as Contract, own).parts[0];
    const isFree = asked
      ? asked.to.greaterThan(asked.from) && isUncovered(asked, spans) && claimedAmounts(part, claim).length > 0
      : next.some((one) => one.claim.of === claim.of);
    if (!isFree) throw new Rejection('conflict', 'invoice-claim-taken');
  }

  private async contentOf(
    workshopId: string,
    { contract, part, claim }: { contract: Contract; part: ContractPart; claim: StageClaim },
  ): Promise<InvoiceContent> {
    const client = await this.parts.jobs.client(workshopId, contract.clientId);
    const workshop = await this.parts.workshops.get(workshopId);
    const names = stageNames(await wordsOf(this.parts, workshopId), part, claim);
    const { terms } = await this.parts.settings.read(workshopId);
    return {
      ...{ clientId: contract.clientId, jobId: contract.jobId, buyer: buyerOf(client, workshop.country) },
      ...{ pricesHold: 'net', allowancesCharges: [], roundsToCash: false, note: '' },
      ...{ deliveredOn: null, period: null, dueOn: null, terms },
      exemptions: part.exemptions.map(({ code, reason }) => ({ code, reasonCode: '', reason: shortened(reason, 300) })),
      lines: stageLines(claimedAmounts(part, claim), names, currencyDigits(contract.currency)),
    };
  }
}
