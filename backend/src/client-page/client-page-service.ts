import type { ClientActor } from '#shared/actor/client-actor';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import { firstPaper } from '#shared/client-page/first-paper';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import type { Choice } from '#shared/estimates/draft';
import type { Accounts } from '../accounts';
import type { Agreements } from '../agreements';
import type { Estimates } from '../estimates';
import { jobNumber, type NamedJobRow } from '../jobs';
import { FileAnswer } from '../platform/http/answer';
import type { ClientInvoices } from './client-invoices';
import { presentClientIssue, presentClientSummary } from './client-issue-presenter';
import { presentClientLetterhead } from './client-letterhead-presenter';
import { FrozenIssuePages } from './frozen-issue-pages';

interface Parts {
  readonly accounts: Pick<Accounts, 'workshops'>;
  readonly agreements: Pick<Agreements, 'scope' | 'choices' | 'decisions' | 'papers' | 'questions'>;
  readonly estimates: Pick<Estimates, 'frozen'>;
  readonly invoices: ClientInvoices;
}

const isSameChoice = (one: Choice, other: Choice): boolean =>
  one.length === other.length && one.every((id) => other.includes(id));

/** What a client reads: all that is theirs, one issue, its papers. */
export class ClientPageService {
  private readonly frozen: FrozenIssuePages;

  constructor(private readonly parts: Parts) {
    this.frozen = new FrozenIssuePages(parts.estimates.frozen);
  }

  async overview(client: ClientActor): Promise<ClientOverview> {
    const workshop = await this.parts.accounts.workshops.get(client.workshopId);
    const jobs = await this.parts.agreements.scope.jobs(client);
    const at = { today: await this.today(client), timeZone: workshop.timeZone };
    return {
      letterhead: presentClientLetterhead(workshop),
      client: { name: client.name },
      jobs: await Promise.all(jobs.map((job) => this.jobOf(client, job, at))),
      invoices: [...(await this.parts.invoices.of(client))],
    };
  }

  /** What a visit begins with, in one answer; of an issue that cannot be read it is told where it is opened. */
  async opening(client: ClientActor): Promise<{ papers: ClientOverview; issue: ClientIssue | null }> {
    const papers = await this.overview(client);
    const first = firstPaper(papers);
    return { papers, issue: first === undefined ? null : await this.issue(client, first).catch(() => null) };
  }

  async logo({ workshopId }: ClientActor): Promise<FileAnswer> {
    const { bytes, name, media } = await this.parts.accounts.workshops.logo(workshopId);
    return new FileAnswer(bytes, { name, media, shownInPage: true });
  }

  async issue(client: ClientActor, issueId: string): Promise<ClientIssue> {
    const { scope, decisions, questions } = this.parts.agreements;
    const issue = await scope.issue(client, issueId);
    const { workshopId } = client;
    return presentClientIssue({
      issue,
      workshop: await this.parts.accounts.workshops.get(workshopId),
      all: await scope.shownOf(workshopId, issue.job.id),
      decision: await decisions.onIssue(workshopId, issueId),
      questions: await questions.ofJob(workshopId, issue.job.id),
      frozen: await this.frozen.of(issue),
      mayChoose: issue.snapshot.calculatorVersion === calculatorVersion,
      today: await this.today(client),
    });
  }

  /** The accepted paper where there is one and nothing else is asked for, else the one of the choice. */
  async paper(client: ClientActor, issueId: string, choice: Choice): Promise<FileAnswer> {
    const { scope, decisions, papers, choices } = this.parts.agreements;
    const issue = await scope.issue(client, issueId);
    const decision = await decisions.onIssue(client.workshopId, issueId);
    if (decision?.kind === 'accepted' && (choice.length === 0 || isSameChoice(choice, decision.choice)))
      return papers.of(decision);
    const { paper } = await choices.reviewed(issue, choice);
    return new FileAnswer(paper.bytes, { name: paper.name, media: paper.media });
  }

  private today({ workshopId }: ClientActor): Promise<string> {
    return this.parts.agreements.decisions.today(workshopId);
  }

  private async jobOf(client: ClientActor, job: NamedJobRow, at: { today: string; timeZone: string }) {
    const { scope, decisions } = this.parts.agreements;
    const issues = await scope.shownOf(client.workshopId, job.id);
    const ids = issues.map(({ row }) => row.id);
    const accepted = await decisions.accepted(client.workshopId, ids);
    const shown = issues.map((issue) => presentClientSummary(issue, { ...at, decision: accepted.get(issue.row.id) }));
    return { id: job.id, number: jobNumber(job), title: job.title, issues: shown };
  }
}
