import { HttpErrorResponse } from '@angular/common/http';
import type { Problem } from '#shared/problems/problem-schema';
import { ProblemError } from '../problems/problem-error';

const plain = (status: number, title: string): Problem => ({
  type: 'about:blank',
  title,
  status,
  instance: '',
  errors: [],
});

/** Answers of an endpoint that sends files arrive as files, problems too. */
async function contentOf(error: HttpErrorResponse): Promise<unknown> {
  if (!(error.error instanceof Blob)) return error.error;
  const text = await error.error.text();
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

/** A problem as the server describes it; its schema is fetched when there is one, since a first page has none. */
async function describedIn(content: unknown): Promise<Problem | undefined> {
  const { problemSchema } = await import('#shared/problems/problem-schema');
  return problemSchema.safeParse(content).data;
}

/** What a failed request amounts to; anything that is not an answer of HTTP is thrown on. */
export async function problemOf(error: unknown): Promise<ProblemError> {
  if (!(error instanceof HttpErrorResponse)) throw error;
  if (error.status === 0)
    return new ProblemError(plain(0, $localize`The workshop’s records cannot be reached just now.`));
  const described = await describedIn(await contentOf(error)).catch(() => undefined);
  const wait = Number(error.headers.get('retry-after'));
  const problem = described ?? plain(error.status, $localize`The server could not answer (${error.status}:status:).`);
  return new ProblemError(problem, wait > 0 ? wait : undefined);
}
