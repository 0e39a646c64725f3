import type { Contract, ContractPart } from '#shared/agreements/contract';
import { partAccount, type NextClaim } from '#shared/invoices/contract-account';
import type { ClaimingInvoice } from '#shared/invoices/claiming-invoice';
import type { DueStage } from '#shared/invoices/due-stages-endpoints';
import { jobNumber, type Jobs, type NamedJobRow } from '../jobs';
import { countLimit, type Page, type PageAsked } from '../platform/database/workshop-rows';
import { ClaimReading } from './claim-reading';
import type { InvoiceRepository } from './invoice-repository';
import type { StageDayRepository } from './stage-day-repository';
import { daysOfClaims, type StageDays } from './stage-days';

/** Contracts of a workshop as far as `isOpen` says of a part, by its gross amount, that something of it may be left. */
export type OpenContracts = (
  workshopId: string,
  isOpen: (part: { issueId: string; gross_minor: number }) => boolean,
) => Promise<readonly Contract[]>;

interface Parts {
  readonly invoices: InvoiceRepository;
  readonly days: StageDayRepository;
  readonly jobs: Pick<Jobs, 'several'>;
  readonly contracts: OpenContracts;
}

interface Facts {
  readonly jobs: ReadonlyMap<string, NamedJobRow>;
  readonly claims: readonly ClaimingInvoice[];
  readonly daysOf: ReturnType<typeof daysOfClaims>;
}

type Listed = DueStage & { readonly key: string };
type ListedPart = Pick<Contract, 'currency'> & { readonly part: ContractPart };

/** A deposit falls due on acceptance; everything else when it was reached, and until then on its planned day. */
const dueOn = ({ claim }: NextClaim, part: ContractPart, { plannedOn, reachedOn }: StageDays): string | null =>
  reachedOn ?? plannedOn ?? (claim.of === 'deposit' ? part.acceptedOn : null);

function listed(job: NamedJobRow, { part, currency }: ListedPart, facts: Facts): Listed[] {
  const { issueId, kind, number, title, acceptedOn } = part;
  return partAccount(part, facts.claims).next.map((next, place) => {
    const days = facts.daysOf(part, next.claim);
    const day = dueOn(next, part, days);
    return {
      ...{ jobId: job.id, jobNumber: jobNumber(job), jobTitle: job.title },
      ...{ clientId: job.clientId, clientName: job.clientName },
      ...{ issueId, kind, number, title, currency, dueOn: day, isReached: days.reachedOn !== null },
      ...next,
      // What has no day stands at the end, in the order it was agreed.
      key: [day ?? '9999-12-31', acceptedOn, issueId, String(place).padStart(3, '0')].join(' '),
    };
  });
}

const shown = ({ key: _key, ...stage }: Listed): DueStage => stage;

/** What can be invoiced, across all jobs: read in the same few queries however many there are. */
export class DueStagesService {
  constructor(private readonly parts: Parts) {}

  async page(workshopId: string, { cursor, limit }: PageAsked): Promise<Page<DueStage>> {
    const all = await this.all(workshopId);
    const later = all.filter(({ key }) => cursor === undefined || key > cursor);
    const items = later.slice(0, limit);
    const next = later.length > limit ? (items.at(-1)?.key ?? null) : null;
    const count = Math.min(all.length, countLimit);
    return { items: items.map(shown), next, count, countIsExact: all.length <= countLimit };
  }

  private async all(workshopId: string): Promise<Listed[]> {
    const standing = await this.parts.invoices.standingByIssue(workshopId);
    const isOpen = (part: { issueId: string; gross_minor: number }) =>
      part.gross_minor !== (standing.get(part.issueId) ?? 0);
    const contracts = await this.parts.contracts(workshopId, isOpen);
    const facts = await this.facts(workshopId, contracts);
    const stages = contracts.flatMap(({ jobId, currency, parts }) => {
      const job = facts.jobs.get(jobId);
      return job ? parts.flatMap((part) => listed(job, { part, currency }, facts)) : [];
    });
    return stages.sort((one, other) => (one.key < other.key ? -1 : 1));
  }

  private async facts(workshopId: string, contracts: readonly Contract[]): Promise<Facts> {
    const jobIds = contracts.map(({ jobId }) => jobId);
    const issueIds = contracts.flatMap(({ parts }) => parts.map(({ issueId }) => issueId));
    const jobs = await this.parts.jobs.several(workshopId, jobIds);
    const claims = await new ClaimReading(this.parts.invoices).ofJobs(workshopId, jobIds);
    const days = await this.parts.days.ofIssues(workshopId, issueIds);
    return { claims, jobs: new Map(jobs.map((job) => [job.id, job])), daysOf: daysOfClaims(days) };
  }
}
