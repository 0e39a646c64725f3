import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { ContractPart } from '#shared/agreements/contract';
import { creditedRest } from '#shared/invoices/credited-rest';
import { takenClaims, type ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import { claimRounding, contractAccount, partAccount } from '#shared/invoices/contract-account';
import type { ContractAccountAnswer } from '#shared/invoices/contract-account-endpoints';
import { fittingClaim } from '#shared/invoices/fitting-claim';
import { claimedAmounts, claimedDue, type PlannedClaim, type StageClaim } from '#shared/invoices/stage-claim';
import { isUncovered, type WorkSpan } from '#shared/invoices/uncovered-work';
import { D, type MinorUnits } from '#shared/money/decimal';
import { Rejection } from '#shared/problems/rejection';
import { ClaimReading } from './claim-reading';
import type { DraftService } from './draft-service';
import type { InvoiceRow } from './invoice-model';
import type { InvoiceParts } from './invoice-parts';
import { writtenOffOf } from './settling-service';
import type { StageDayRepository } from './stage-day-repository';
import { StageDrafts, type Claimed } from './stage-drafts';

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

const spanOf = (claim: StageClaim): WorkSpan[] =>
  claim.of === 'work' ? [{ from: new D(claim.from_percent), to: new D(claim.to_percent) }] : [];

/** The same claim is the same text, however its percentages were written. */
export const claimKey = (claim: StageClaim): string => {
  if (claim.of === 'again') return `again ${claim.invoiceId}`;
  if (claim.of !== 'work') return claim.of;
  return `work ${new D(claim.from_percent).toString()} ${new D(claim.to_percent).toString()}`;
};

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

  /** Drafts the invoice or credit note of a claim that nothing claims yet; two who do so at once are let through one by one. */
  async begin(actor: Actor, jobId: string, asked: StageAsked): Promise<InvoiceRow> {
    const { workshopId } = actor;
    await this.parts.jobs.job(workshopId, jobId);
    await this.parts.settings.hold(workshopId);
    const claimed = await this.partOf(workshopId, jobId, asked.issueId);
    const first = await this.firstDraft(claimed, asked.claim);
    const { currency } = claimed.contract;
    return this.parts.drafts.add(actor, first.content, {
      ...{ id: asked.invoiceId, kind: 'invoice', currency, claimIssueId: asked.issueId, claim: asked.claim },
      ...first.given,
      known_minor: first.known_minor,
    });
  }

  /** What the paper of a claim is rounded by, at the moment it is issued. */
  async roundingOf({ workshopId, jobId, claim, claimIssueId, kind, roundingMinor }: InvoiceRow): Promise<MinorUnits> {
    if (!claim || !claimIssueId || jobId === null) return 0;
    if (claim.of === 'again' || kind === 'credit-note') return roundingMinor;
    const { part } = await this.partOf(workshopId, jobId, claimIssueId);
    return claimRounding(part, claim);
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

  private claims(workshopId: string, jobId: string): Promise<ClaimingInvoice[]> {
    return new ClaimReading(this.parts.invoices).ofJobs(workshopId, [jobId]);
  }

  private async partOf(workshopId: string, jobId: string, issueId: string): Promise<Claimed> {
    const contract = await this.parts.contract(workshopId, jobId);
    if (!contract) throw new Rejection('conflict', 'invoice-no-contract');
    const part = contract.parts.find((one) => one.issueId === issueId);
    if (!part) throw new Rejection('not-found', 'invoice-claim-unknown');
    return { workshopId, contract, part };
  }

  private async firstDraft(claimed: Claimed, claim: StageClaim) {
    const { workshopId, contract, part } = claimed;
    const own = (await this.claims(workshopId, contract.jobId)).filter(({ issueId }) => issueId === part.issueId);
    const drafts = new StageDrafts(this.parts);
    if (claim.of === 'again') {
      const taken = takenClaims(own);
      const invoice = taken.find(({ invoiceId }) => invoiceId === claim.invoiceId);
      const rest = invoice && creditedRest(invoice, taken);
      if (!invoice || !rest || rest.due_minor <= 0) throw new Rejection('conflict', 'invoice-claim-taken');
      return { ...(await drafts.again(claimed, rest, invoice.number)), given: {} };
    }
    mustBeFree(part, claim, own);
    if (part.gross_minor >= 0) return { ...(await drafts.planned(claimed, claim)), given: {} };
    const { credits, fitting } = await this.credited(claimed, claim);
    const given = { kind: 'credit-note', creditedInvoiceId: credits.id, claim: fitting } as const;
    return { ...(await drafts.takenAway(claimed, fitting, credits)), given };
  }

  /** The newest invoice of the job that takes the whole of what is taken away, else the newest that takes some of it. */
  private async credited({ workshopId, contract, part }: Claimed, claim: PlannedClaim) {
    if (claim.of !== 'work') throw new Rejection('conflict', 'invoice-claim-taken');
    const { jobId, clientId, currency } = contract;
    const all = await this.parts.invoices.issuedOfJob(workshopId, jobId);
    const rooms = [];
    for (const credits of all.filter((row) => row.clientId === clientId && row.currency === currency)) {
      const writtenOff_minor = await writtenOffOf(this.parts.payments, workshopId, credits.id);
      rooms.push({ credits, room_minor: credits.dueMinor - credits.creditedMinor - writtenOff_minor });
    }
    const whole_minor = -claimedDue(part, claim);
    const some = rooms.filter(({ room_minor }) => room_minor > 0);
    for (const { credits, room_minor } of [...some.filter((one) => one.room_minor >= whole_minor), ...some]) {
      const fitting = fittingClaim(part, claim, room_minor);
      if (fitting) return { credits, fitting };
    }
    throw new Rejection('conflict', 'invoice-nothing-to-credit');
  }
}

/** Nothing is claimed twice, nor before it is due. */
function mustBeFree(part: ContractPart, claim: PlannedClaim, own: readonly ClaimingInvoice[]): void {
  const spans = takenClaims(own).flatMap((one) => spanOf(one.claim));
  const [asked] = spanOf(claim);
  const { next } = partAccount(part, own);
  const isFree = asked
    ? asked.to.greaterThan(asked.from) && isUncovered(asked, spans) && claimedAmounts(part, claim).length > 0
    : next.some((one) => one.claim.of === claim.of);
  if (!isFree) throw new Rejection('conflict', 'invoice-claim-taken');
}
