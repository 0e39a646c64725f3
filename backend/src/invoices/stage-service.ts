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
import { todayIn, type InvoiceParts } from './invoice-parts';
import { writtenOffOf } from './settling-service';
import type { StageDayRepository } from './stage-day-repository';
import { daysOfClaims, stageDayKey } from './stage-days';
import { mustBeReachable, reachedDeed, type StageDayAsked } from './stage-day-asked';
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
    const daysOf = daysOfClaims(days);
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
      next: account.parts[place].next.map((next) => ({ ...next, ...daysOf(part, next.claim) })),
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

  /** Names the day a stage is planned for, or the one it was reached on; the other stays as it is. */
  async nameDay(actor: Actor, jobId: string, asked: StageDayAsked): Promise<void> {
    const { workshopId } = actor;
    const { issueId, claim, of, day } = asked;
    await this.parts.jobs.job(workshopId, jobId);
    const { part } = await this.partOf(workshopId, jobId, issueId);
    if (of === 'reached') mustBeReachable(part, asked, await todayIn(this.parts, workshopId));
    const kept = daysOfClaims(await this.parts.days.ofIssues(workshopId, [issueId]))(part, claim);
    const days = of === 'planned' ? { ...kept, plannedOn: day } : { ...kept, reachedOn: day };
    await this.parts.days.put(workshopId, { ...days, issueId, id: newId(), claimKey: stageDayKey(part, claim) });
    const told = of === 'planned' ? { code: 'history-stage-planned' as const } : reachedDeed(part, asked);
    await this.parts.audit.record(actor, { subject: { kind: 'job', id: jobId }, jobId, after: asked, ...told });
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
