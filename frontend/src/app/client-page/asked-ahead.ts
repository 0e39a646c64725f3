import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { writeOpeningHead, writePapersHead } from './opening-head';

/** What came of a request, as far as a call reads it. */
export interface Answer {
  readonly ok: boolean;
  readonly status: number;
  readonly url: string;
  readonly headers: Readonly<Record<string, string>>;
  readonly body: unknown;
}

interface Visit {
  readonly token: string;
  readonly papers: ClientOverview;
  readonly issue: ClientIssue | null;
}

interface Show {
  readonly issue: (issue: ClientIssue) => void;
  readonly papers: (papers: ClientOverview) => void;
}

const addressOfIssue = (issueId: string): string => `/api/client/issues/${issueId}`;
const overview = '/api/client/overview';
const session = '/api/session';
const visits = '/api/client/visits';
/** The page that shows what an address answers. */
const pageOf = (address: string): string => (address === overview ? '/client/papers' : address.replace('/api', ''));

async function answerOf(response: Response): Promise<Answer> {
  const { ok, status, url, headers } = response;
  return { ok, status, url, headers: Object.fromEntries(headers), body: await response.json() };
}

/**
 * What the first page of a client asks in any case, asked while the application itself is not there: each answer is given out once. This
 * file comes before everything else, so it imports no endpoints; its spec holds the addresses to theirs.
 */
export class AskedAhead {
  private readonly answers = new Map<string, Promise<Answer>>();

  constructor(
    private readonly ask: typeof fetch = (address, request) => fetch(address, request),
    private readonly show: Show = {
      issue: (issue) => writeOpeningHead(document, issue),
      papers: (papers) => writePapersHead(document, papers),
    },
  ) {}

  /**
   * Begins the visit whose secret an address holds, or asks for the paper it shows. Done when the head of that stands, or none will; answers
   * the page of the paper a visit leads to, so that the application can begin there.
   */
  async begin({ pathname, hash }: Pick<Location, 'pathname' | 'hash'>): Promise<string | undefined> {
    const asked = this.send('GET', session);
    const secret = pathname === '/client' ? hash.slice(1) : '';
    // What cannot be shown ahead is shown, or complained of, by the application.
    return (secret === '' ? this.read(pathname) : this.visit(asked, secret)).catch(() => undefined);
  }

  /** The answer to a request that was asked already. */
  answerTo(method: string, address: string): Promise<Answer> | undefined {
    const answer = this.answers.get(`${method} ${address}`);
    this.answers.delete(`${method} ${address}`);
    return answer;
  }

  private async visit(asked: Promise<Answer>, secret: string): Promise<string | undefined> {
    const answer = await this.keep('POST', visits, this.opened(asked, secret));
    if (!answer.ok) return undefined;
    const { papers, issue } = answer.body as Visit;
    if (issue) this.show.issue(issue);
    else this.show.papers(papers);
    return pageOf(issue ? addressOfIssue(issue.issue.id) : overview);
  }

  /** After the session, not beside it: a visit is begun under a new one, and the later answer would put the former back. */
  private async opened(asked: Promise<Answer>, secret: string): Promise<Answer> {
    const { token } = (await asked).body as { token: string };
    const headers = { 'content-type': 'application/json', 'x-csrf-token': token };
    const answer = await this.ask(visits, {
      ...{ method: 'POST', headers, body: JSON.stringify({ token: secret }) },
    }).then(answerOf);
    if (answer.ok) this.keepFirst(answer, (await asked).body);
    return answer;
  }

  /** The paper that is read first came with the visit, and so did the session of it: nobody has to ask for them. */
  private keepFirst(answer: Answer, before: unknown): void {
    const { token, papers, issue } = answer.body as Visit;
    const [address, body] = issue ? [addressOfIssue(issue.issue.id), issue] : [overview, papers];
    void this.keep('GET', address, Promise.resolve({ ...answer, url: address, body }));
    const own = { ...(before as object), token };
    void this.keep('GET', session, Promise.resolve({ ...answer, url: session, body: own }));
  }

  private async read(page: string): Promise<undefined> {
    if (page === '/client/papers') await this.shown(overview, this.show.papers);
    const [, issueId] = /^\/client\/issues\/([^/]+)$/.exec(page) ?? [];
    if (issueId) await this.shown(addressOfIssue(issueId), this.show.issue);
  }

  private async shown<T>(address: string, show: (paper: T) => void): Promise<void> {
    const { ok, body } = await this.send('GET', address);
    if (ok) show(body as T);
  }

  private send(method: string, address: string): Promise<Answer> {
    return this.keep(method, address, this.ask(address, { method }).then(answerOf));
  }

  private keep(method: string, address: string, answer: Promise<Answer>): Promise<Answer> {
    // Whoever takes it asks again by themselves; a failure nobody takes is none.
    answer.catch(() => undefined);
    this.answers.set(`${method} ${address}`, answer);
    return answer;
  }
}

/** What this page asked ahead. */
export const askedAhead = new AskedAhead();
