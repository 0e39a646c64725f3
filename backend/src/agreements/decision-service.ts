import { v7 as newId } from 'uuid';
import type { ClientActor } from '#shared/actor/client-actor';
import type { Choice } from '#shared/estimates/draft';
import { Rejection } from '#shared/problems/rejection';
import type { WorkshopService } from '../accounts';
import type { Estimates } from '../estimates';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { Clock } from '../platform/clock/clock';
import type { FileStore } from '../platform/files/file-store';
import type { ChoiceService } from './choice-service';
import type { ClientIssueRows, ClientScope } from './client-scope';
import type { DecisionLetters } from './decision-letters';
import type { DecisionRow } from './decision-model';
import { mayBeAccepted, mayBeDeclined, type Deciding } from './accepted-policy';
import type { DecisionRepository } from './decision-repository';

interface Parts {
  readonly decisions: DecisionRepository;
  readonly choices: ChoiceService;
  readonly scope: ClientScope;
  readonly estimates: Pick<Estimates, 'issues'>;
  readonly workshops: WorkshopService;
  readonly files: FileStore;
  readonly letters: DecisionLetters;
  readonly clock: Clock;
}

/** What a client says who accepts: their name as they typed it, what they chose, and the price and paper they looked at. */
export interface Acceptance {
  readonly typedName: string;
  readonly choice: Choice;
  readonly gross_minor: number;
  readonly pdfSha256: string;
}

type Start = Pick<DecisionRow, 'id' | 'issueId' | 'jobId' | 'clientId' | 'accessId' | 'at' | 'address'>;

/** What clients decide on issues: once each, all or nothing, with what they saw. */
export class DecisionService {
  constructor(private readonly parts: Parts) {}

  /** Keeps the decision with the exact paper, marks the issue, and writes to both sides; refused where anything is not as it was shown. */
  async accept(client: ClientActor, issueId: string, wish: Acceptance & { address: string }): Promise<DecisionRow> {
    const issue = await this.parts.scope.hold(client, issueId);
    const deciding = await this.deciding(issue);
    mayBeAccepted(deciding);
    const { chosen, paper, sha256 } = await this.parts.choices.reviewed(issue, wish.choice);
    const { net_minor, tax_minor, gross_minor, taxes } = chosen.figures.price;
    if (gross_minor !== wish.gross_minor || sha256 !== wish.pdfSha256)
      throw new Rejection('conflict', 'decision-changed');
    const file = await this.parts.files.save(client.workshopId, paper);
    const row = await this.parts.decisions.add(client.workshopId, {
      ...this.start(client, issue, wish.address),
      ...{ kind: 'accepted', typedName: wish.typedName, choice: chosen.choice, reason: '' },
      taxes: taxes.map((of) => ({ tax: of.tax, net_minor: of.net_minor, tax_minor: of.tax_minor })),
      ...{ netMinor: net_minor, taxMinor: tax_minor, grossMinor: gross_minor, pdfSha256: sha256, fileId: file.id },
    });
    await this.mark(client, deciding, { state: 'accepted', note: wish.typedName, choice: row.choice });
    await this.parts.letters.accepted(client, issue, row);
    return row;
  }

  async decline(client: ClientActor, issueId: string, wish: { reason: string; address: string }): Promise<DecisionRow> {
    const issue = await this.parts.scope.hold(client, issueId);
    const deciding = await this.deciding(issue);
    mayBeDeclined(deciding);
    const { netMinor, taxMinor, grossMinor } = issue.row;
    const row = await this.parts.decisions.add(client.workshopId, {
      ...this.start(client, issue, wish.address),
      ...{ kind: 'declined', typedName: '', choice: [], reason: wish.reason, taxes: [] },
      ...{ netMinor, taxMinor, grossMinor, pdfSha256: '', fileId: null },
    });
    await this.mark(client, deciding, { state: 'declined', note: wish.reason.slice(0, 1000) });
    await this.parts.letters.declined(client, issue, row);
    return row;
  }

  onIssue(workshopId: string, issueId: string): Promise<DecisionRow | undefined> {
    return this.parts.decisions.onIssue(workshopId, issueId);
  }

  /** What was accepted of these issues, by their ids. */
  async accepted(workshopId: string, issueIds: readonly string[]): Promise<ReadonlyMap<string, DecisionRow>> {
    const rows = await this.parts.decisions.accepted(workshopId, issueIds);
    return new Map(rows.map((row) => [row.issueId, row]));
  }

  /** Today where the workshop is. */
  async today(workshopId: string): Promise<string> {
    const { timeZone } = await this.parts.workshops.get(workshopId);
    return dayOfInstant(this.parts.clock.now().getTime(), timeZone);
  }

  private async deciding(issue: ClientIssueRows): Promise<Deciding> {
    const { workshopId } = issue.row;
    const all = await this.parts.scope.allOf(workshopId, issue.job.id);
    const { locale } = await this.parts.workshops.get(workshopId);
    return { issue, all, today: await this.today(workshopId), locale };
  }

  private start(client: ClientActor, { row, job }: ClientIssueRows, address: string): Start {
    const { clientId, accessId } = client;
    const at = this.parts.clock.now();
    return { id: newId(), issueId: row.id, jobId: job.id, clientId, accessId, at, address: address.slice(0, 60) };
  }

  private async mark(
    { workshopId, name }: ClientActor,
    { issue, today }: Deciding,
    mark: { state: 'accepted' | 'declined'; note: string; choice?: Choice },
  ): Promise<void> {
    await this.parts.estimates.issues.mark({ workshopId, accountId: null, name }, issue.row.id, {
      ...mark,
      day: today,
    });
  }
}
