import {
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  ElementRef,
  computed,
  inject,
  input,
  model,
  signal,
} from '@angular/core';
import { holdPoints } from '#shared/buildups/buildup';
import { dayLength_minutes } from '#shared/drying/day-length-minutes';
import type { WorkingTime } from '#shared/drying/working-time';
import { Formats } from '../core/formats/formats';
import { holdNames } from './hold-names';
import { lotRibbon } from './lot-ribbon';
import { closedBars, holdRow, ribbonRow, ribbonTicks } from './ribbon-row';
import type { WorkedHold } from './worked-hold';
import type { WorkedLot } from './worked-lot';
import { workingParts } from './working-parts';

type Zoom = 'job' | 'week' | 'day';

const zooms: readonly { readonly zoom: Zoom; readonly name: string }[] = [
  { zoom: 'job', name: $localize`Whole job` },
  { zoom: 'week', name: $localize`By the week` },
  { zoom: 'day', name: $localize`By the day` },
];

const row_px = 64;
const holdRow_px = 48;
const head_px = 34;
/** A week is wide enough for its number. */
const leastDay_px = 8;
const names_px = 176;

/** The lots of a job and elapsed time: hands-on work solid, drying hatched, windows outlined, nights and closed days shaded. No dates. */
@Component({
  selector: 'app-drying-ribbon',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './drying-ribbon.html',
  styleUrl: './drying-ribbon.scss',
})
export class DryingRibbon {
  private readonly formats = inject(Formats);
  private readonly width_px = signal(1000);

  readonly lots = input.required<readonly WorkedLot[]>();
  readonly time = input.required<WorkingTime>();
  readonly elapsed_minutes = input.required<number>();
  /** Carving before the first lot can be begun. */
  readonly carving_minutes = input(0);
  /** Approvals that are waited for. */
  readonly holds = input<readonly WorkedHold[]>([]);
  /** The lot whose steps are told below. */
  readonly chosen = model<string>();

  protected readonly zooms = zooms;
  protected readonly zoom = signal<Zoom>('job');
  protected readonly days = computed(() =>
    Math.max(1, Math.ceil(Math.max(this.elapsed_minutes(), this.carving_minutes()) / dayLength_minutes)),
  );
  private readonly day_px = computed(() => {
    const fitting = Math.max(leastDay_px, (this.width_px() - names_px) / this.days());
    return { job: fitting, week: Math.max(fitting, 42), day: Math.max(fitting, 168) }[this.zoom()];
  });

  protected readonly width = computed(() => this.days() * this.day_px());
  private readonly scale = computed(() => ({ day_px: this.day_px(), width_px: this.width() }));
  protected readonly rows = computed(() => {
    const lots = this.lots().map((lot) => ({
      ...{ key: lot.lotId, name: lot.name, height: row_px },
      ...ribbonRow(lotRibbon(lot, this.time()), this.scale()),
    }));
    let below = head_px;
    return [...this.carving(), ...this.approvals(), ...lots].map((row) => {
      const y = below;
      below += row.height;
      return { ...row, y };
    });
  });
  protected readonly height = computed(() => this.rows().reduce((sum, row) => sum + row.height, head_px));
  protected readonly closed = computed(() => closedBars(this.days(), this.time(), this.day_px()));
  protected readonly ticks = computed(() =>
    ribbonTicks(this.days(), this.day_px()).map((tick) => ({ ...tick, text: this.tickText(tick.day) })),
  );
  protected readonly label = computed(() => {
    const [days, lots] = [this.days(), this.lots().length].map((count) => this.formats.number(count, 0));
    return $localize`Drying ribbon: ${lots}:lots: lots over ${days}:days: days; the tables below say the same`;
  });

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const observer = new ResizeObserver(() => this.width_px.set(host.clientWidth || 1000));
    observer.observe(host);
    inject(DestroyRef).onDestroy(() => observer.disconnect());
  }

  private tickText(day: number): string {
    return $localize`day ${this.formats.number(day, 0)}:day:`;
  }

  private carving() {
    const to_minutes = this.carving_minutes();
    if (to_minutes <= 0) return [];
    const name = $localize`Carving`;
    const work = workingParts({ from_minutes: 0, to_minutes }, this.time()).map((part) => ({ ...part, label: '' }));
    return [{ key: '', name, height: row_px, ...ribbonRow({ work, drying: [], windows: [] }, this.scale()) }];
  }

  /** A row for each kind of approval that is waited for. */
  private approvals() {
    return holdPoints.flatMap((hold) => {
      const own = this.holds().filter((one) => one.hold === hold);
      if (own.length === 0) return [];
      return [{ key: '', name: holdNames[hold], height: holdRow_px, ...holdRow(own, this.scale()) }];
    });
  }
}
