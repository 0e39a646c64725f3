import type { Problem } from '#shared/problems/problem-schema';

/** A refusal of the server, or no answer at all (status 0), with every complaint it made. */
export class ProblemError extends Error {
  override readonly name = 'ProblemError';

  constructor(
    readonly problem: Problem,
    readonly retryAfter_seconds?: number,
  ) {
    super(problem.title);
  }

  get status(): number {
    return this.problem.status;
  }

  /** Nobody answered: the network is away, or the server is. */
  get isUnreachable(): boolean {
    return this.status === 0;
  }

  /** Somebody else was faster; `problem.current` holds what is kept now. */
  get isStale(): boolean {
    return this.status === 412;
  }

  /** Worth asking again by itself after a while. */
  get isPassing(): boolean {
    return this.status === 0 || this.status === 429 || this.status === 503;
  }

  /** The session has ended, or begun anew elsewhere, so that the token sent was an old one. */
  get isOfSession(): boolean {
    return this.status === 401 || this.problem.type === 'urn:problem:problem-forged';
  }
}
