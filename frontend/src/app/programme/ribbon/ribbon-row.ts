import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { ribbonBar } from './ribbon-bar';
import type { DrawnLot, DrawnTask } from './laid-tasks';
import type { Stretch } from './stretch';

const dryingBar = { y: 14, height: 26, radius: 0 };
const windowBar = { y: 9, height: 36, radius: 6 };

/** One line of the ribbon: all its drying one drawing, all its windows another, and its tasks to be pressed. */
@Component({
  // eslint-disable-next-line @angular-eslint/component-selector -- within an SVG an element of our own would not be drawn
  selector: 'g[appRibbonRow]',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg:path class="drying" [attr.d]="drying()" />
    <svg:path class="window" [attr.d]="windows()" />
    @for (one of row().tasks; track one.task.id) {
      <svg:g
        role="button"
        [class]="looks[one.task.look]"
        [class.movable]="one.task.isMovable"
        [class.chosen]="one.task.id === chosen()"
        [attr.data-task]="one.task.id"
        [attr.tabindex]="one.task.id === current() ? 0 : -1"
        [attr.aria-pressed]="one.task.id === chosen()"
        [attr.aria-label]="one.task.story.join(' ')"
      >
        <rect class="touch" y="6" height="42" rx="6" [attr.x]="one.touch.x" [attr.width]="one.touch.width" />
        <path class="work" [attr.d]="one.path" />
      </svg:g>
    }
    <svg:path class="pin" [attr.d]="pins()" />
    @for (name of labels(); track name.x) {
      <svg:text y="58" [attr.x]="name.x">{{ name.text }}</svg:text>
    }
  `,
  styleUrl: './ribbon-row.scss',
})
export class RibbonRow {
  readonly row = input.required<DrawnLot>();
  /** The task of this line that is chosen, if one is. */
  readonly chosen = input<string>();
  /** The task of this line the Tab key leads to, if it is one of these. */
  readonly current = input<string>();

  protected readonly looks = { planned: 'task', done: 'task done', held: 'task held' };
  protected readonly drying = computed(() => this.bars(({ drying }) => drying, dryingBar));
  protected readonly windows = computed(() => this.bars(({ window }) => window, windowBar));
  protected readonly pins = computed(() =>
    this.row()
      .tasks.filter(({ task }) => task.isPinned)
      .map(({ touch }) => `M${touch.x + touch.width / 2 - 3.5} 11a3.5 3.5 0 1 1 7 0a3.5 3.5 0 1 1 -7 0z`)
      .join(''),
  );
  protected readonly labels = computed(() => this.row().tasks.flatMap(({ label }) => label ?? []));

  private bars(of: (task: DrawnTask) => Stretch | null, shape: typeof dryingBar): string {
    return this.row()
      .tasks.map(of)
      .map((one) => (one ? ribbonBar(one, shape) : ''))
      .join('');
  }
}
