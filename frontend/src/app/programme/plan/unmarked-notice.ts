import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { unmarkedTasks } from '#shared/programme/unmarked-tasks';
import { Formats } from '../../core/formats/formats';
import { ProgrammeStore } from './programme-store';
import { TaskWords } from './task-words';

/** So many tasks are named, the others counted. */
const mostNamed = 3;

/** Nobody marks to the minute; by so little it may as well begin later. */
const grace_minutes = 30;

/** Work of an accepted job that should have begun by now and that nobody marked: planned anew it begins now, unless it is said that it went as planned. */
@Component({
  selector: 'app-unmarked-notice',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (unmarked().length > 0) {
      <section role="status">
        <p>{{ told() }}</p>
        <p class="muted" i18n>Planned again, they begin now, with all that follows them.</p>
        <button matButton="outlined" type="button" [disabled]="store.isKeeping()" (click)="mark()" i18n>
          It all went as planned
        </button>
      </section>
    }
  `,
  styles: `
    section {
      display: grid;
      gap: 6px;
      justify-items: start;
      padding: 10px 16px;
      border-left: 3px solid var(--warn);
      border-radius: 0 var(--radius-small) var(--radius-small) 0;
      background: var(--tint);
    }

    button {
      margin-top: 4px;
    }
  `,
})
export class UnmarkedNotice {
  protected readonly store = inject(ProgrammeStore);
  private readonly words = inject(TaskWords);
  private readonly formats = inject(Formats);

  protected readonly unmarked = computed(() => {
    const [answer, now_minutes] = [this.store.answer(), this.store.now_minutes()];
    if (!answer?.isAccepted || !answer.plan || now_minutes === undefined) return [];
    const { plan, marks, items } = answer;
    const known = new Map(items.map((item) => [item.taskId, item]));
    return unmarkedTasks({ plan, marks, now_minutes: now_minutes - grace_minutes }).flatMap(
      (taskId) => known.get(taskId) ?? [],
    );
  });
  protected readonly told = computed(() => {
    const all = this.unmarked();
    const names = all.slice(0, mostNamed).map((item) => `${item.lot}, ${this.words.name(item)}`);
    const further = all.length - names.length;
    const list = names.join('; ');
    if (further === 0) return $localize`Should have begun by now, and nobody marked it: ${list}:tasks:.`;
    const count = this.formats.number(further, 0);
    return $localize`Should have begun by now, and nobody marked it: ${list}:tasks:; and ${count}:count: more.`;
  });

  protected mark(): void {
    void this.store.markAsPlanned(this.unmarked().map(({ taskId }) => taskId));
  }
}
