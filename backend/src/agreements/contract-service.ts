import type { Contract, ContractPart } from '#shared/agreements/contract';
import { sumMinor } from '#shared/money/sum-minor';
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
  readonly jobs: Pick<Jobs, 'job'>;
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

/** Without stages of its own the whole is one, without a name. */
function planOf({ draft }: Snapshot): Pick<ContractPart, 'plan' | 'stageNames'> {
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
    ...planOf(snapshot),
  };
}

const isAccepted = ({ row }: IssueOfEstimate): boolean => row.state === 'accepted';
const inOrder = (one: ContractPart, other: ContractPart): number =>
  one.kind.localeCompare(other.kind) || one.acceptedOn.localeCompare(other.acceptedOn);

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
    const issues = await Promise.all(accepted.map(({ row }) => this.parts.frozen.read(workshopId, row.id)));
    const parts = issues
      .map((issue) =>
        partOf(
          issue,
          decisions.find(({ issueId }) => issueId === issue.row.id),
        ),
      )
      .toSorted(inOrder);
    const sum = (pick: (part: ContractPart) => number) => sumMinor(parts.map(pick));
    return {
      ...{ jobId, clientId, currency, parts },
      net_minor: sum((part) => part.net_minor),
      tax_minor: sum((part) => part.tax_minor),
      gross_minor: sum((part) => part.gross_minor),
    };
  }

  async decisions(workshopId: string, jobId: string): Promise<DecisionRow[]> {
    await this.parts.jobs.job(workshopId, jobId);
    return this.parts.decisions.ofJob(workshopId, jobId);
  }
}
