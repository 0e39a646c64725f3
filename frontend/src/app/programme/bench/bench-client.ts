import { Injectable, inject } from '@angular/core';
import { markAsPlanned, markTask, readBenchDay } from '#shared/programme/board-endpoints';
import type { BenchTask } from '#shared/programme/bench-task';
import type { MarkKind } from '#shared/programme/bench-day-schema';
import { Api } from '../../core/api/api';

/** The calls of the day at the bench. */
@Injectable({ providedIn: 'root' })
export class BenchClient {
  private readonly api = inject(Api);

  day(asked: { readonly day?: string; readonly personId?: string }, signal: AbortSignal) {
    return this.api.call(readBenchDay, { query: asked, signal });
  }

  asPlanned({ estimateId, taskId }: BenchTask) {
    return this.api.call(markAsPlanned, { params: { estimateId }, body: { taskIds: [taskId] } });
  }

  /** Now, as the server's clock has it. */
  mark({ estimateId, taskId }: BenchTask, mark: MarkKind) {
    return this.api.call(markTask, { params: { estimateId }, body: { taskId, mark, at: null, left_minutes: null } });
  }
}
