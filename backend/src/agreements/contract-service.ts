import type { Contract, ContractPart } from '#shared/agreements/contract';
import { holdsTogether } from '#shared/agreements/holds-together';
import { groupedBy } from '#shared/units/grouped-by';
import { sumMinor } from '#shared/money/sum-minor';
import type { TaxedNet } from '#shared/money/tax-by-category';
import { Rejection } from '#shared/problems/rejection';
import type { FrozenIssue, FrozenIssueService, IssueOfEstimate } from '../estimates';
import type { Jobs } from '../jobs';
import type { Snapshot } from '#shared/estimates/snapshot';
import { words } from '../platform/http/words';
import type { DecisionRow } from './decision-model';
import type { DecisionRepository } from './decision-repository';
import { frozenExemptions } from './frozen-exemptions';

interface Parts {
  readonly decisions: DecisionRepository;
  readonly frozen: FrozenIssueService;
  readonly jobs: Pick<Jobs, 'job' | 'several'>;
}

type Sums = Pick<ContractPart, 'choice' | 'taxes' | 'net_minor' | 'tax_minor' | 'gross_minor'>;

/** What was decided on the page; what the office marked by hand is the base, as it was issued. */
function sumsOf({ snapshot }: FrozenIssue, decision: DecisionRow | undefined): Sums {
  if (decision) {
    const { choice, taxes, netMinor, taxMinor, grossMinor } = decision;
    return { choice, taxes, net_minor: netMinor, tax_minor: taxMinor, gross_minor: grossMinor };
  }
  const { taxes, net_minor, tax_minor, gross_minor } = snapshot.figures.price;
  const bare = taxes.map((of) => ({ tax: of.tax, net_minor: of.net_minor, tax_minor: of.tax_minor }));
  return { choice: snapshot.choice, taxes: bare, net_minor, tax_minor, gross_minor };
}

const atOnce = { plan: { deposit_percent: 0, stages_percent: [100], retention_percent: 0 }, stageNames: [''] };

/** Without stages of its own the whole is one, without a name; what takes away is given back whole, with nothing held back of it. */
function planOf({ draft }: Snapshot, { gross_minor }: Sums): Pick<ContractPart, 'plan' | 'stageNames'> {
  if (gross_minor < 0) return atOnce;
  const { deposit_percent, parts, retention_percent } = draft.settings.stages;
  const stages = parts.length > 0 ? parts : [{ name: '', percent: 100 }];
  const stages_percent = stages.map(({ percent }) => percent);
  return { plan: { deposit_percent, stages_percent, retention_percent }, stageNames: stages.map(({ name }) => name) };
}

function partOf(issue: FrozenIssue, decision: DecisionRow | undefined): ContractPart {
  const { row, estimate, snapshot } = issue;
  const sums = sumsOf(issue, decision);
  return {
    issueId: row.id,
    estimateId: estimate.id,
    kind: estimate.kind,
    number: words('paper-number-letter', { number: estimate.number, letter: row.letter }),
    title: snapshot.draft.settings.title,
    acceptedOn: row.markedOn ?? snapshot.issuedOn,
    ...sums,
    exemptions: frozenExemptions(snapshot, sums.choice),
    ...planOf(snapshot, sums),
  };
}

const isAccepted = ({ row }: IssueOfEstimate): boolean => row.state === 'accepted';
const inOrder = (one: ContractPart, other: ContractPart): number =>
  one.kind.localeCompare(other.kind) || one.acceptedOn.localeCompare(other.acceptedOn);

/** An accepted issue by what was agreed on it. */
interface OpenPart {
  readonly issueId: string;
  readonly gross_minor: number;
}

function contractOf(
  head: Pick<Contract, 'jobId' | 'clientId' | 'currency'>,
  issues: readonly FrozenIssue[],
  decisions: readonly DecisionRow[],
): Contract {
  const decided = new Map(decisions.map((decision) => [decision.issueId, decision]));
  const parts = issues.map((issue) => partOf(issue, decided.get(issue.row.id))).toSorted(inOrder);
  const sum = (pick: (part: ContractPart) => number) => sumMinor(parts.map(pick));
  return {
    ...{ ...head, parts },
    net_minor: sum((part) => part.net_minor),
    tax_minor: sum((part) => part.tax_minor),
    gross_minor: sum((part) => part.gross_minor),
  };
}

/** What a workshop and its client agreed on: accepted issues, and nothing that was not. */
export class ContractService {
  constructor(private readonly parts: Parts) {}

  /** The contract of a job; nothing as long as nothing is accepted. */
  async contract(workshopId: string, jobId: string): Promise<Contract | undefined> {
    const { clientId } = await this.parts.jobs.job(workshopId, jobId);
    const accepted = (await this.parts.frozen.ofJob(workshopId, jobId)).filter(isAccepted).toReversed();
    const currency = accepted[0]?.estimate.currency;
    if (currency === undefined) return undefined;
    const decisions = await this.parts.decisions.ofJob(workshopId, jobId);
    const ids = accepted.map(({ row }) => row.id);
    const found = new Map((await this.parts.frozen.several(workshopId, ids)).map((issue) => [issue.row.id, issue]));
    return contractOf(
      { jobId, clientId, currency },
      ids.flatMap((id) => found.get(id) ?? []),
      decisions,
    );
  }

  /** Contracts of all jobs, of each those parts of which something may be left: in the same few queries however many there are. */
  async open(workshopId: string, isOpen: (part: OpenPart) => boolean): Promise<Contract[]> {
    const rows = await this.parts.frozen.accepted(workshopId);
    const ids = rows.map(({ id }) => id);
    const decisions = ids.length === 0 ? [] : await this.parts.decisions.accepted(workshopId, ids);
    const agreed = new Map(decisions.map((one) => [one.issueId, one.grossMinor]));
    const open = rows.filter(({ id, grossMinor }) =>
      isOpen({ issueId: id, gross_minor: agreed.get(id) ?? grossMinor }),
    );
    const issues = await this.parts.frozen.several(
      workshopId,
      open.map(({ id }) => id),
    );
    const byJob = groupedBy(issues, ({ estimate }) => estimate.jobId);
    const jobs = await this.parts.jobs.several(workshopId, [...byJob.keys()]);
    return jobs.flatMap(({ id: jobId, clientId }) => {
      const own = byJob.get(jobId) ?? [];
      return own.length === 0
        ? []
        : [contractOf({ jobId, clientId, currency: own[0].estimate.currency }, own, decisions)];
    });
  }

  /** Refused where what was agreed on a job, with this beside it, would come below nothing. */
  async mustHold(workshopId: string, jobId: string, more: readonly TaxedNet[] = []): Promise<void> {
    const contract = await this.contract(workshopId, jobId);
    if (!holdsTogether([...(contract?.parts ?? []), { taxes: more }]))
      throw new Rejection('conflict', 'variation-takes-too-much');
  }

  async decisions(workshopId: string, jobId: string): Promise<DecisionRow[]> {
    await this.parts.jobs.job(workshopId, jobId);
    return this.parts.decisions.ofJob(workshopId, jobId);
  }
}
