import type { ClientOverview } from '#shared/client-page/client-overview-schema';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { firstPaper } from './first-paper';
import { writeOpeningHead } from './opening-head';

/**
 * What the first page of a client asks in any case, asked while the application itself is still on its way: each answer is given out
 * once. This file comes before everything else, so it imports no endpoints; its spec holds the addresses to theirs.
 */
export class AskedAhead {
  private readonly answers = new Map<string, Promise<Response>>();

  constructor(
    private readonly ask: typeof fetch = (address, request) => fetch(address, request),
    private readonly show: (issue: ClientIssue) => void = (issue) => writeOpeningHead(document, issue),
  ) {}

  /** Begins the visit whose secret an address holds, or asks for the paper it shows. */
  begin({ pathname, hash }: Pick<Location, 'pathname' | 'hash'>): void {
    const session = this.send('GET', '/api/session');
    const secret = pathname === '/client' ? hash.slice(1) : '';
    if (secret === '') this.sendReading(pathname);
    else void this.keep('POST', '/api/client/visits', this.visit(session, secret));
  }

  /** The answer to a request that was asked already. */
  answerTo(method: string, address: string): Promise<Response> | undefined {
    const answer = this.answers.get(`${method} ${address}`);
    this.answers.delete(`${method} ${address}`);
    return answer;
  }

  /** After the session, not beside it: a visit is begun under a new one, and the later answer would put the former back. */
  private async visit(session: Promise<Response>, secret: string): Promise<Response> {
    const { token } = (await (await session).clone().json()) as { token: string };
    const headers = { 'content-type': 'application/json', 'x-csrf-token': token };
    const answer = await this.ask('/api/client/visits', {
      ...{ method: 'POST', headers, body: JSON.stringify({ token: secret }) },
    });
    if (answer.ok) {
      const { papers } = (await answer.clone().json()) as { papers: ClientOverview };
      this.sendReading(firstPaper(papers));
    }
    return answer;
  }

  private sendReading(page: string): void {
    if (page === '/client/papers') void this.send('GET', '/api/client/overview');
    // What cannot be shown ahead is shown, or complained of, by the application.
    if (page.startsWith('/client/issues/'))
      this.send('GET', `/api${page}`)
        .then(this.heardOf)
        .catch(() => undefined);
  }

  private readonly heardOf = async (answer: Response): Promise<void> => {
    if (answer.ok) this.show((await answer.clone().json()) as ClientIssue);
  };

  private send(method: string, address: string): Promise<Response> {
    return this.keep(method, address, this.ask(address, { method }));
  }

  private keep(method: string, address: string, answer: Promise<Response>): Promise<Response> {
    // Whoever takes it asks again by themselves; a failure nobody takes is none.
    answer.catch(() => undefined);
    this.answers.set(`${method} ${address}`, answer);
    return answer;
  }
}

/** What this page asked ahead. */
export const askedAhead = new AskedAhead();
