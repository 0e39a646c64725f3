import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Climate } from '#shared/drying/climate';
import { chosenNames } from '#shared/estimates/chosen-names';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { Session } from '../../core/session/session';
import { FormComplaint } from '../../ui/field/form-complaint';
import { FindingList } from '../../ui/page/finding-list';
import { Skeleton } from '../../ui/page/skeleton';
import { DatedRibbon } from '../ribbon/dated-ribbon';
import { RibbonTable } from '../ribbon/ribbon-table';
import type { DraggedTask } from '../ribbon/task-drag';
import { ApprovalList } from './approval-list';
import { LotList } from './lot-list';
import { movedConsequences } from './pinned-request';
import { Planner } from './planner';
import { PlanWords } from './plan-words';
import { ProgrammePlanning } from './programme-planning';
import { ProgrammeStart } from './programme-start';
import { ProgrammeStore } from './programme-store';
import { ShownProgramme } from './shown-programme';
import { TaskPanel } from './task-panel';
import { UnmarkedNotice } from './unmarked-notice';
import { WhatIfPanel } from './what-if-panel';

/** The programme of an estimate: when it is ready, the dated ribbon, planning it, pins, approvals, and other ways compared. */
@Component({
  selector: 'app-estimate-programme',
  imports: [
    ApprovalList,
    DatedRibbon,
    FindingList,
    FormComplaint,
    LotList,
    MatButton,
    ProgrammeStart,
    RibbonTable,
    Skeleton,
    TaskPanel,
    UnmarkedNotice,
    WhatIfPanel,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [Planner, PlanWords, ProgrammePlanning, ProgrammeStore, ShownProgramme],
  templateUrl: './estimate-programme.html',
  styleUrl: './estimate-programme.scss',
})
export class EstimateProgramme {
  private readonly words = inject(Words);
  private readonly session = inject(Session);
  private readonly shown = inject(ShownProgramme);
  private readonly planWords = inject(PlanWords);
  protected readonly formats = inject(Formats);
  protected readonly planning = inject(ProgrammePlanning);
  protected readonly store = inject(ProgrammeStore);

  readonly estimateId = input.required<string>();
  /** Rises with every change of the estimate. */
  readonly version = input(0);
  /** The issue that stands with the client, if there is one. */
  readonly sentLetter = input<string>();
  /** What is offered beside the base, in its order. */
  readonly alternatives = input<readonly { readonly id: string; readonly name: string }[]>([]);
  readonly whatIfLots = input<readonly { readonly lotId: string; readonly name: string }[]>([]);
  readonly buildUps = input<readonly { readonly id: string; readonly name: string }[]>([]);
  readonly shopAir = input<Climate>();
  /** Told the day that is offered, once a plan is kept. */
  readonly tellsDay = input<(day: string | undefined) => void>();

  protected readonly isAllowed = this.session.may('owner', 'estimator', 'office');
  protected readonly mayEdit = computed(() => this.session.may('owner', 'estimator'));
  protected readonly lotName = $localize`Lot`;
  protected readonly movesLittle = signal(false);
  protected readonly chosen = signal<string | undefined>(undefined);
  /** The lot whose way of working is being changed. */
  protected readonly changedLot = signal<string | undefined>(undefined);
  protected readonly moved = signal<DraggedTask | undefined>(undefined);

  protected readonly lots = computed(() => this.shown.lots());
  protected readonly open = computed(() => this.shown.open());
  protected readonly heading = computed(() => this.planWords.heading());
  protected readonly hands = computed(() => this.planWords.hands());
  protected readonly chips = computed(() => this.planWords.chips());
  protected readonly idle = computed(() => this.planWords.idle());
  protected readonly progress = computed(() => this.planWords.progress());
  protected readonly proposed = computed(() => this.planWords.proposed());
  protected readonly helps = computed(() => this.planWords.helps());
  /** The alternatives it is planned with; undefined where none are offered. */
  protected readonly plannedWith = computed(() => {
    const [offered, choice] = [this.alternatives(), this.store.answer()?.inputs.choice ?? []];
    if (offered.length === 0) return undefined;
    const names = chosenNames(offered, choice);
    return names.length > 0
      ? $localize`Planned with ${names.join(', ')}:names:`
      : $localize`Planned without alternatives`;
  });
  protected readonly isStale = computed(() => {
    const answer = this.store.answer();
    return answer !== undefined && answer.plan !== null && !answer.isCurrent;
  });
  protected readonly brokenFirst = computed(() => (this.store.answer()?.broken ?? []).slice(0, 5));
  /** What stands in the way of any plan. */
  protected readonly isStopped = computed(
    () =>
      this.store.isKeeping() ||
      (this.store.answer()?.items.length ?? 0) === 0 ||
      (this.store.answer()?.findings ?? []).some(({ kind }) => kind === 'refuse'),
  );
  protected readonly chosenLot = computed(() =>
    this.lots().find(({ tasks }) => tasks.some(({ id }) => id === this.chosen())),
  );
  protected readonly chosenTask = computed(() => this.chosenLot()?.tasks.find(({ id }) => id === this.chosen()));
  /** Coating may be done in portions and by several; carving is shared as it comes. */
  protected readonly isCoated = computed(() => {
    const item = this.store.answer()?.items.find(({ taskId }) => taskId === this.chosen());
    return item !== undefined && item.kind !== 'carving';
  });
  /** What becomes impossible, said while a task is still being moved. */
  protected readonly consequences = computed(() => {
    const [moved, plan, request] = [this.moved(), this.store.plan(), this.store.request()];
    return moved && plan && request ? movedConsequences(plan, request, moved) : undefined;
  });

  constructor() {
    effect(() => {
      if (this.isAllowed) this.store.open(this.estimateId(), this.version());
    });
    effect(() => {
      const answer = this.store.answer();
      this.tellsDay()?.(answer?.isCurrent ? answer.dates?.offeredOn : undefined);
    });
  }

  protected plan(): void {
    void this.planning.plan(this.movesLittle());
  }

  protected async keep(): Promise<void> {
    await this.store.keepProposal();
  }

  /** Puts a task elsewhere: what comes of it is shown to be kept or given up, and where it cannot be, nothing changes. */
  protected async place(taskId: string, start_minutes: number | null): Promise<void> {
    this.moved.set(start_minutes === null ? undefined : { taskId, start_minutes });
    const isPossible = await this.planning.place(taskId, start_minutes);
    if (isPossible) this.moved.set(undefined);
  }
}
