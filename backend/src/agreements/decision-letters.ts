import { chosenNames } from '#shared/estimates/chosen-names';
import type { LetterValues } from '#shared/agreements/filled-letter';
import type { ClientActor } from '#shared/actor/client-actor';
import type { Jobs } from '../jobs';
import { words } from '../platform/http/words';
import type { ClientIssueRows } from './client-scope';
import type { DecisionRow } from './decision-model';
import type { LetterFigures } from './letter-figures';
import type { LetterService } from './letter-service';

interface Parts {
  readonly letters: LetterService;
  readonly jobs: Pick<Jobs, 'client'>;
  readonly origin: string;
}

/** What both sides are written when a client has decided; the accepted paper goes to both. */
export class DecisionLetters {
  constructor(private readonly parts: Parts) {}

  async accepted(
    { workshopId, clientId, email }: ClientActor,
    issue: ClientIssueRows,
    row: DecisionRow,
  ): Promise<void> {
    const enclosures = row.fileId === null ? [] : [{ fileId: row.fileId }];
    const client = await this.parts.jobs.client(workshopId, clientId);
    const total = (figures: LetterFigures) => figures.total(row, issue.estimate.currency);
    const { job, number } = this.named(issue);
    const values = (figures: LetterFigures) => ({ job, number, total: total(figures) });
    await this.parts.letters.post(workshopId, { kind: 'accepted', client, values, enclosures });
    await this.parts.letters.notify(workshopId, {
      kind: 'accepted',
      values: (figures) => ({
        ...{ ...this.named(issue), client: client.name, signed: row.typedName },
        ...{ total: total(figures), chosen: this.chosen(issue, row) },
      }),
      enclosures,
      ...(email === '' ? {} : { replyTo: email }),
    });
  }

  declined({ workshopId, name, email }: ClientActor, issue: ClientIssueRows, row: DecisionRow): Promise<void> {
    return this.parts.letters.notify(workshopId, {
      kind: 'declined',
      values: () => ({ ...this.named(issue), client: name, text: row.reason }),
      ...(email === '' ? {} : { replyTo: email }),
    });
  }

  private chosen({ snapshot }: ClientIssueRows, { choice }: DecisionRow): string {
    const names = chosenNames(snapshot.draft.settings.alternatives, choice);
    return names.length > 0 ? words('notice-chosen', { names: names.join(', ') }) : words('notice-chosen-base');
  }

  private named({ job, estimate, row }: ClientIssueRows): LetterValues & { job: string; number: string } {
    const number = words('paper-number-letter', { number: estimate.number, letter: row.letter });
    return { job: job.title, number, link: `${this.parts.origin}/jobs/${job.id}` };
  }
}
