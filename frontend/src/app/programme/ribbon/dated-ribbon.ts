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
import { closedStretches, ribbonMarks, type RibbonMark } from './ribbon-marks';
import { ribbonLayout } from './ribbon-layout';
import type { RibbonLot, RibbonTask } from './ribbon-lot';
import { ribbonRange } from './ribbon-range';
import { pixelOf } from './ribbon-scale';
import { storyPlace } from './story-place';
import { taskAfter } from './task-after';
import { RibbonView } from './ribbon-view';
import { draggedBar, TaskDrag, type DraggedTask } from './task-drag';

const day_minutes = 1440;

/** Lots down, time across: work solid, drying hatched, windows outlined, nights and closed days shaded. Only what is in view is drawn. */
@Component({
  selector: 'app-dated-ribbon',
  imports: [MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(document:keydown.escape)': 'giveUp()' },
  templateUrl: './dated-ribbon.html',
  styleUrls: ['./dated-ribbon.scss', './dated-ribbon-drawing.scss'],
})
export class DatedRibbon {
  private readonly formats = inject(Formats);
  private readonly injector = inject(Injector);
  private readonly isSmall = smallScreen();
  private readonly scroller = viewChild.required<ElementRef<HTMLElement>>('scroller');
  private readonly dragging = new TaskDrag();

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

  protected readonly row_px = 68;
  protected readonly head_px = 36;
  protected readonly zooms = [
    { name: $localize`Day`, days: 1 },
    { name: $localize`Week`, days: 7 },
    { name: $localize`Month`, days: 31 },
  ];
  protected readonly names_px = computed(() => (this.isSmall() ? 104 : 168));
  protected readonly told = signal<{ task: RibbonTask; x: number; y: number } | undefined>(undefined);
  private readonly range = computed(() => ribbonRange(this.lots(), this.now_minutes()));
  private readonly first = computed(() => this.range().first_minutes);
  protected readonly view = new RibbonView(this.range);
  protected readonly height = computed(() => this.lots().length * this.row_px);
  protected readonly rows = computed(() =>
    ribbonLayout(this.lots(), { scale: this.view.scale(), part: this.view.part(), row_px: this.row_px }),
  );
  protected readonly marks = computed(() => ribbonMarks(this.view.part(), this.view.scale(), this.frame()));
  protected readonly days = computed(() =>
    this.marks()
      .filter(({ kind, x }) => kind !== 'hour' && x < this.view.width() - 40)
      .map((mark) => ({ x: mark.x, text: this.dayText(mark) })),
  );
  protected readonly closed = computed(() =>
    closedStretches(this.open(), { part: this.view.part(), scale: this.view.scale() }),
  );
  protected readonly nowX = computed(() => {
    const now = this.now_minutes();
    if (now === undefined) return null;
    const x = pixelOf(now, this.view.scale());
    return x >= 0 && x <= this.view.width() ? x : null;
  });
  protected readonly lineOf = computed(() => `M0 0H${this.view.width()}`);
  private readonly asked = signal<string | undefined>(undefined);
  /** The task the Tab key leads to. */
  protected readonly current = computed(() => {
    const shown = this.rows().flatMap(({ tasks }) => tasks);
    const isShown = (id: string | undefined) => shown.some(({ task }) => task.id === id);
    return [this.asked(), this.chosen()].find(isShown) ?? shown.at(0)?.task.id;
  });
  protected readonly ghost = computed(() => {
    const at = this.dragging.at();
    return at && draggedBar(this.lots(), at, this.view.scale());
  });

  constructor() {
    const destroy = inject(DestroyRef);
    afterNextRender(() => {
      const element = this.scroller().nativeElement;
      const measure = () =>
        this.view.look({ width: Math.max(80, element.clientWidth - this.names_px()), height: element.clientHeight });
      const observer = new ResizeObserver(measure);
      observer.observe(element);
      const turn = (event: WheelEvent) => this.turn(event);
      element.addEventListener('wheel', turn, { passive: false });
      destroy.onDestroy(() => {
        observer.disconnect();
        element.removeEventListener('wheel', turn);
      });
      measure();
      this.show(this.firstDays());
    });
    effect(() => this.begin(this.first()));
  }

  /** So many days fit into the width; without a number all of it. */
  protected show(days: number | undefined): void {
    const { first_minutes, last_minutes } = this.range();
    const shown = days ?? (last_minutes - first_minutes) / day_minutes;
    this.scrollTo(this.view.zoom(this.view.seen().width / (Math.max(1, shown) * 24)));
  }

  protected zoomBy(factor: number, at_px?: number): void {
    this.scrollTo(this.view.zoom(this.view.hour_px() * factor, at_px));
  }

  goTo(minutes: number): void {
    this.scrollTo(this.view.leftFor(minutes));
  }

  protected follow(): void {
    const { scrollLeft: left, scrollTop: top } = this.scroller().nativeElement;
    this.view.look({ left, top });
    this.told.set(undefined);
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

  protected grip(event: PointerEvent, task: RibbonTask): void {
    if (!task.isMovable || event.button !== 0 || event.pointerType === 'touch') return;
    this.dragging.begin(task, event.clientX);
  }

  protected drag(event: PointerEvent): void {
    const at = this.dragging.move(event.clientX, this.view.hour_px());
    if (!at) return;
    // Only once it moves: a press that does not stays with the task, and chooses it.
    this.scroller().nativeElement.setPointerCapture?.(event.pointerId);
    this.told.set(undefined);
    this.dragged.emit(at);
  }

  protected drop(): void {
    const at = this.dragging.end();
    if (at) this.dropped.emit(at);
  }

  protected giveUp(): void {
    if (this.dragging.end()) this.dragged.emit(undefined);
    this.told.set(undefined);
  }

  protected tell({ clientX, clientY, pointerType }: PointerEvent, task: RibbonTask): void {
    if (pointerType !== 'touch' && !this.dragging.at()) this.tellAt(task, { x: clientX + 14, y: clientY + 18 });
  }

  protected tellFocused({ target }: FocusEvent, task: RibbonTask): void {
    this.asked.set(task.id);
    const element = target as Element;
    if (!element.matches(':focus-visible')) return;
    const { left, bottom } = element.getBoundingClientRect();
    this.tellAt(task, { x: left, y: bottom + 8 });
  }

  private tellAt(task: RibbonTask, at: { x: number; y: number }): void {
    this.told.set({ task, ...storyPlace(at, { width: innerWidth, height: innerHeight }) });
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

  private turn(event: WheelEvent): void {
    if (!event.ctrlKey && !event.metaKey) return;
    event.preventDefault();
    const at_px = event.clientX - this.scroller().nativeElement.getBoundingClientRect().left - this.names_px();
    this.zoomBy(event.deltaY < 0 ? 1.2 : 1 / 1.2, Math.max(0, at_px));
  }

  /** Begins at now, where that lies within, else at the first task. */
  private begin(first_minutes: number): void {
    const now = untracked(this.now_minutes);
    const from = now !== undefined && now > first_minutes ? now : first_minutes + day_minutes / 4;
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

  private dayText({ day, kind }: RibbonMark): string {
    if (kind === 'month') return this.formats.day(day, 'month');
    return this.formats.day(day, kind === 'week' || day.endsWith('-01') ? 'short' : 'weekday');
  }
}
