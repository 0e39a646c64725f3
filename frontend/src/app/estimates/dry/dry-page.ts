import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import { BatchList } from '../../buildups';
import { Formats } from '../../core/formats/formats';
import { DryingRibbon, HoldTable, JointMovement, LotSteps } from '../../drying';
import { ReasonPanel } from '../../ui/figure/reason-panel';
import { EmptyState } from '../../ui/page/empty-state';
import { FindingList } from '../../ui/page/finding-list';
import { LaterWidget } from '../../ui/page/later-widget';
import { elapsedWords } from '../elapsed-words';
import { EstimateStore } from '../estimate-store';
import { PlaceExplanation } from '../places/place-explanation';
import { ReadyDay } from '../workspace/ready-day';
import { AirForm } from './air-form';
import { DryCautions } from './dry-cautions';
import { DryLots } from './dry-lots';
import { LotMembers } from './lot-members';
import { LotTable } from './lot-table';
import { WoodMoisture } from './wood-moisture';
import { ZoneTimes } from './zone-times';

/** Dry: the coats of every lot laid into the working week in the shop's air, as elapsed time; dates come with the programme. */
@Component({
  selector: 'app-dry-page',
  imports: [
    AirForm,
    BatchList,
    DryingRibbon,
    EmptyState,
    FindingList,
    HoldTable,
    JointMovement,
    LaterWidget,
    LotMembers,
    LotSteps,
    LotTable,
    ReasonPanel,
    RouterLink,
    WoodMoisture,
    ZoneTimes,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class.dated]': 'isProgramme()' },
  providers: [DryCautions, DryLots, PlaceExplanation],
  templateUrl: './dry-page.html',
  styleUrl: './dry-page.scss',
})
export class DryPage {
  private readonly formats = inject(Formats);
  private readonly router = inject(Router);
  private readonly readyDay = inject(ReadyDay);
  private readonly asked = signal<string | undefined>(undefined);
  protected readonly store = inject(EstimateStore);
  protected readonly lots = inject(DryLots);
  protected readonly cautions = inject(DryCautions);

  /** Which part is open, from the address. */
  readonly part = input<string>();

  protected readonly isProgramme = computed(() => this.part() === 'programme' && this.store.seesPrices());
  /** What the programme needs to know of the estimate. */
  protected readonly programme = computed(() => ({
    estimateId: this.store.head()?.id,
    version: this.store.head()?.version,
    alternatives: this.store.settings()?.alternatives ?? [],
    sentLetter: this.store.issues().find(({ state }) => state === 'sent')?.letter,
    whatIfLots: this.lots.all().map(({ lotId, name }) => ({ lotId, name })),
    buildUps: this.store.card()?.buildUps.buildUps.map(({ id, name }) => ({ id, name })) ?? [],
    shopAir: this.store.settings()?.shop,
    tellsDay: this.tellsDay,
  }));
  private readonly tellsDay = (day: string | undefined): void => this.readyDay.tell(day);
  protected readonly dry = computed(() => this.store.figures()?.dry);
  protected readonly heading = computed(() => {
    const dry = this.dry();
    if (!dry) return '';
    const elapsed = { workingDays: dry.elapsed_workingDays, weeks: dry.elapsed_weeks };
    const { days, weeks } = elapsedWords(this.formats, elapsed);
    return `${days}, ${weeks}`;
  });
  /** The lot whose steps are told: the one chosen, else the first. */
  protected readonly chosen = computed(
    () => this.lots.all().find(({ lotId }) => lotId === this.asked()) ?? this.lots.all().at(0),
  );

  protected choose(lotId: string | undefined): void {
    this.asked.set(lotId);
  }

  constructor() {
    inject(PlaceExplanation);
  }

  /** A house value is changed where it stands, in the rate card. */
  protected openCard(value: string): void {
    void this.router.navigate(['/rates', this.store.head()?.rateCardId], { queryParams: { value } });
  }
}
