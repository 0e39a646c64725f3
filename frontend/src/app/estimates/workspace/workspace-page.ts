import { ChangeDetectionStrategy, Component, computed, input, viewChild } from '@angular/core';
import type { OpenEstimate } from '../open-estimate';
import { Workspace } from './workspace';

/** The page of one estimate. Another estimate is another workspace: nothing of the first stays. */
@Component({
  selector: 'app-workspace-page',
  imports: [Workspace],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (opened of [open()]; track opened.estimateId) {
      <app-workspace [open]="opened" />
    }
  `,
})
export class WorkspacePage {
  readonly jobId = input.required<string>();
  readonly estimateId = input.required<string>();

  private readonly workspace = viewChild(Workspace);

  protected readonly open = computed<OpenEstimate>(() => ({ jobId: this.jobId(), estimateId: this.estimateId() }));

  /** Sends what is unsent, and waits for it a moment. */
  async keep(): Promise<void> {
    await this.workspace()?.keep();
  }
}
