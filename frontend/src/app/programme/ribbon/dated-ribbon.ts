import {
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  type ElementRef,
  Injector,
  afterNextRender,
  computed,
  effect,
  inject,
  input,
  model,
  output,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { ProgrammeFrame } from '#shared/programme/programme-frame';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import { Formats } from '../../core/formats/formats';
import { smallScreen } from '../../ui/screen/small-screen';
import { RibbonGround } from './ribbon-ground';
import { RibbonLines } from './ribbon-lines';
import type { RibbonLot, RibbonTask } from './ribbon-lot';
import { RibbonHead } from './ribbon-head';
import { RibbonPointer } from './ribbon-pointer';
import { ribbonListening, type RibbonListener } from './ribbon-listening';
import { firstNotDone } from './first-not-done';
import { ribbonRange } from './ribbon-range';
import { RibbonRow } from './ribbon-row';
import { pixelOf, zoomByWheel } from './ribbon-scale';
import { RibbonView } from './ribbon-view';
import { taskAfter } from './task-after';
import { draggedBar, type DraggedTask } from './task-drag';

const day_minutes = 1440;
const rest_ms = 120;

/** Lots down, time across: work solid, drying hatched, windows outlined, nights and closed days shaded. Only what is in view is drawn. */
@Component({
  selector: 'app-dated-ribbon',
  imports: [MatButton, RibbonRow, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(document:keydown.escape)': 'giveUp()' },
  templateUrl: './dated-ribbon.html',
  styleUrls: ['./dated-ribbon.scss', './dated-ribbon-drawing.scss'],
})
export class DatedRibbon implements RibbonListener {
  private readonly formats = inject(Formats);
  private readonly injector = inject(Injector);
  private readonly isSmall = smallScreen();
  private readonly scroller = viewChild.required<ElementRef<HTMLElement>>('scroller');
  private readonly lines = new RibbonLines();

  readonly label = input.required<string>();
  readonly lots = input.required<readonly RibbonLot[]>();
  readonly frame = input.required<ProgrammeFrame>();
  /** When somebody works, in order. */
  readonly open = input.required<readonly MomentSpan[]>();
  readonly now_minutes = input<number>();
  /** How many days it shows at first. */
  readonly firstDays = input(6);
  readonly chosen = model<string>();
  readonly dragged = output<DraggedTask | undefined>();
  readonly dropped = output<DraggedTask>();

  readonly row_px = 68;
  protected readonly head_px = 36;
  protected readonly zooms = [
    { name: $localize`Day`, days: 1 },
    { name: $localize`Week`, days: 7 },
    { name: $localize`Month`, days: 31 },
  ];
  protected readonly names_px = computed(() => (this.isSmall() ? 104 : 168));
  private readonly range = computed(() => ribbonRange(this.lots(), this.now_minutes()));
  private readonly first = computed(() => this.range().first_minutes);
  readonly view = new RibbonView(this.range);
  readonly height = computed(() => this.lots().length * this.row_px);
  protected readonly rows = computed(() =>
    this.lines.in(this.lots(), { scale: this.view.laidScale(), part: this.view.laidPart(), row_px: this.row_px }),
  );
  protected readonly ground = new RibbonGround(this);
  protected readonly head = new RibbonHead(this.ground, this.view, this.formats);
  protected readonly hasWindows = computed(() =>
    this.lots().some(({ tasks }) => tasks.some(({ window }) => window !== null)),
  );
  protected readonly stretched = computed(() => (this.view.stretch() === 1 ? null : `scale(${this.view.stretch()} 1)`));
  protected readonly pointer = new RibbonPointer(this.rows, this.view.stretch);
  private resting: ReturnType<typeof setTimeout> | undefined;
  private readonly asked = signal<string | undefined>(undefined);
  /** The task the Tab key leads to, and its line. */
  protected readonly current = computed(() => {
    const shown = this.rows().flatMap(({ lot, tasks }) =>
      tasks.map(({ task }) => ({ lotId: lot.id, taskId: task.id })),
    );
    const of = (id: string | undefined) => shown.find(({ taskId }) => taskId === id);
    return of(this.asked()) ?? of(this.chosen()) ?? shown.at(0);
  });
  protected readonly ghost = computed(() => {
    const at = this.pointer.dragged();
    const bar = at && draggedBar(this.lots(), at, this.view.scale());
    return bar && { ...bar, y: this.lots().findIndex(({ id }) => id === bar.lotId) * this.row_px };
  });

  constructor() {
    const destroy = inject(DestroyRef);
    afterNextRender(() => {
      const element = this.scroller().nativeElement;
      destroy.onDestroy(ribbonListening(element, this));
      destroy.onDestroy(() => clearTimeout(this.resting));
      this.measure(element);
      this.show(this.firstDays());
    });
    effect(() => this.begin(this.first()));
  }

  /** So many days fit into the width; without a number all of it. */
  protected show(days: number | undefined): void {
    const { first_minutes, last_minutes } = this.range();
    const shown = days ?? (last_minutes - first_minutes) / day_minutes;
    this.zoomTo(this.view.seen().width / (Math.max(1, shown) * 24));
  }

  protected zoomBy(factor: number): void {
    this.zoomTo(this.view.hour_px() * factor);
  }

  private zoomTo(hour_px: number): void {
    const left = this.view.zoom(hour_px);
    this.view.settle();
    this.scrollTo(left);
  }

  goTo(minutes: number): void {
    this.scrollTo(this.view.leftFor(minutes));
  }

  measure({ clientWidth, clientHeight }: HTMLElement): void {
    this.view.look({ width: Math.max(80, clientWidth - this.names_px()), height: clientHeight });
  }

  follow(): void {
    const { scrollLeft: left, scrollTop: top } = this.scroller().nativeElement;
    this.view.look({ left, top });
    this.pointer.hush();
  }

  leave(): void {
    this.pointer.hush();
  }

  protected press(event: KeyboardEvent): void {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key === '+' || event.key === '-') this.zoomBy(event.key === '+' ? 1.6 : 0.6);
    else if (!this.pressAtTask(event)) return;
    event.preventDefault();
  }

  private pressAtTask(event: KeyboardEvent): boolean {
    const taskId = (event.target as Element).closest('[data-task]')?.getAttribute('data-task');
    if (!taskId) return false;
    if (event.key === 'Enter' || event.key === ' ') {
      this.chosen.set(taskId);
      return true;
    }
    const next = taskAfter(this.lots(), taskId, event.key);
    if (next) this.lead(next);
    return next !== undefined;
  }

  move(event: PointerEvent): void {
    const at = this.pointer.move(event, this.view.hour_px());
    if (!at) return;
    // Only once it moves: a press that does not stays with the task, and chooses it.
    this.scroller().nativeElement.setPointerCapture?.(event.pointerId);
    this.dragged.emit(at);
  }

  protected drop(): void {
    const at = this.pointer.release();
    if (at) this.dropped.emit(at);
  }

  protected giveUp(): void {
    if (this.pointer.release()) this.dragged.emit(undefined);
    this.pointer.hush();
  }

  choose(event: MouseEvent): void {
    const task = this.pointer.taskAt(event);
    if (task) this.chosen.set(task.id);
  }

  /** Where the keyboard is, that is told. */
  protected attend({ target }: FocusEvent): void {
    const element = target as Element;
    const taskId = element.getAttribute('data-task');
    if (!taskId) return;
    this.asked.set(taskId);
    if (!element.matches(':focus-visible')) return;
    const { left, bottom } = element.getBoundingClientRect();
    const task = this.lots()
      .flatMap(({ tasks }) => tasks)
      .find(({ id }) => id === taskId);
    this.pointer.tell(task, { x: left, y: bottom + 8 });
  }

  /** Puts the keyboard at a task, and the task into view. */
  private lead(task: RibbonTask): void {
    const index = this.lots().findIndex(({ tasks }) => tasks.includes(task));
    const element = this.scroller().nativeElement;
    const { left, width, top, height } = this.view.seen();
    const [x, y] = [pixelOf(task.start_minutes, this.view.scale()), index * this.row_px];
    if (x < left || x > left + width - 60) element.scrollLeft = this.view.leftFor(task.start_minutes);
    if (y < top || y + this.row_px + this.head_px > top + height) element.scrollTop = y - height / 3;
    this.follow();
    this.asked.set(task.id);
    const focus = () => element.querySelector<SVGElement>('g.task[tabindex="0"]')?.focus();
    afterNextRender(focus, { injector: this.injector });
  }

  /** What is laid out is stretched until the wheel, or two fingers, rest. */
  turn(event: WheelEvent): void {
    const { ctrlKey, metaKey, deltaY, clientX } = event;
    if (!ctrlKey && !metaKey) return;
    event.preventDefault();
    const at_px = clientX - this.scroller().nativeElement.getBoundingClientRect().left - this.names_px();
    this.scrollTo(this.view.zoom(this.view.hour_px() * zoomByWheel(deltaY), Math.max(0, at_px)));
    clearTimeout(this.resting);
    this.resting = setTimeout(() => this.view.settle(), rest_ms);
  }

  /** Begins at the first work that is not done. */
  private begin(first_minutes: number): void {
    const from = firstNotDone(untracked(this.lots), untracked(this.now_minutes)) ?? first_minutes + day_minutes / 4;
    afterNextRender(() => this.scrollTo(this.view.leftFor(from)), { injector: this.injector });
  }

  private scrollTo(left: number): void {
    this.view.look({ left });
    const put = () => {
      this.scroller().nativeElement.scrollLeft = left;
      this.follow();
    };
    afterNextRender(put, { injector: this.injector });
  }
}
