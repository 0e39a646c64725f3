import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { RibbonTask } from '../ribbon/ribbon-lot';
import { clockOfMinutes, minutesOfClock } from './minutes-of-clock';
import { ProgrammeStore } from './programme-store';
import { TaskHands } from './task-hands';
import { taskWork } from './task-work';

/** The chosen task: its whole story, and its time to be typed, pinned and set free. */
@Component({
  selector: 'app-task-panel',
  imports: [MatButton, TaskHands],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let one = task();
    <div class="head">
      <h3>{{ one.story[0] }}</h3>
      <button matButton type="button" (click)="closed.emit()" i18n>Close</button>
    </div>
    @for (sentence of told(); track $index) {
      <p>{{ sentence }}</p>
    }
    @if (isCoated()) {
      <div class="actions no-print">
        <button matButton type="button" (click)="lotAsked.emit()" i18n>How this lot is worked</button>
      </div>
    }
    @for (work of works(); track work.workId) {
      <app-task-hands class="no-print" [work]="work" />
    }
    @if (one.isMovable) {
      <form class="row no-print" (submit)="$event.preventDefault(); put(at.value)">
        <label [for]="'task-at'" i18n>Start at</label>
        <input #at id="task-at" class="entry" type="datetime-local" step="300" [value]="clock()" />
        <button matButton="outlined" type="submit" [disabled]="isBusy()" i18n>Pin to this time</button>
        @if (one.isPinned) {
          <button matButton type="button" [disabled]="isBusy()" (click)="freed.emit()" i18n>Let it move again</button>
        }
      </form>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 4px;
      padding: 14px 18px;
      border: 1px solid var(--line);
      border-radius: var(--radius-large);
      background: var(--paper);
    }

    .head {
      display: flex;
      gap: 12px;
      align-items: baseline;
      justify-content: space-between;
    }

    h3 {
      font-size: 1.125rem;
      line-height: 1.5rem;
    }

    .entry {
      flex: none;
      width: 220px;
    }

    form {
      margin-top: 8px;
    }
  `,
})
export class TaskPanel {
  private readonly store = inject(ProgrammeStore);

  readonly task = input.required<RibbonTask>();
  readonly isBusy = input(false);
  /** A time was typed: the minute of the programme. */
  readonly placed = output<number>();
  /** Whether its lot may be worked otherwise. */
  readonly isCoated = input(false);
  readonly lotAsked = output();
  readonly freed = output();
  readonly closed = output();

  /** The work whose hands may be entered: of what may still be planned, for who may plan it. */
  protected readonly works = computed(() => {
    const answer = this.store.answer();
    const work = answer && this.task().isMovable ? taskWork(answer, this.task().id) : null;
    return work ? [work] : [];
  });
  protected readonly told = computed(() => this.task().story.slice(1));
  protected readonly clock = computed(() => {
    const frame = this.store.frame();
    return frame ? clockOfMinutes(this.task().start_minutes, frame) : '';
  });

  protected put(text: string): void {
    const frame = this.store.frame();
    const minutes = frame && minutesOfClock(text, frame);
    if (minutes !== undefined) this.placed.emit(minutes);
  }
}
