import { type ErrorHandler, Injectable, inject } from '@angular/core';
import { Notices } from './notices';
import { ProblemError } from './problem-error';

/** The last net: what no page dealt with is said to the person and left in the console for whoever looks into it. */
@Injectable()
export class PageErrorHandler implements ErrorHandler {
  private readonly notices = inject(Notices);

  handleError(error: unknown): void {
    const problem = problemIn(error);
    if (!problem) console.error(error);
    this.notices.complain(
      problem?.message ?? $localize`Something went wrong on this page. Reload it; nothing already kept is lost.`,
    );
  }
}

/** A problem met inside a promise arrives wrapped in what was rejected. */
function problemIn(error: unknown): ProblemError | undefined {
  if (error instanceof ProblemError) return error;
  const inner =
    (error as { rejection?: unknown; cause?: unknown } | null)?.rejection ??
    (error as { cause?: unknown } | null)?.cause;
  return inner instanceof ProblemError ? inner : undefined;
}
