import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { FindingList } from '../../ui/page/finding-list';
import { EstimateStore } from '../estimate-store';
import { PartList } from '../parts/part-list';
import { PartPlace } from '../parts/part-place';
import { PlaceExplanation } from '../places/place-explanation';
import { AlternativesPart } from './alternatives-part';
import { CardPart } from './card-part';
import { CardsInUse } from './cards-in-use';
import { ExtrasPart } from './extras-part';
import { MoneyBar } from './money-bar';
import { PresentationChoice } from './presentation-choice';
import { PriceLines } from './price-lines';
import { PriceNames } from './price-names';
import { pricePartKeys, PriceParts, type PricePartKey } from './price-parts';
import { profitExplained } from './profit-explained';
import { ProfitForm } from './profit-form';
import { StagesPart } from './stages-part';

/** Price: what the estimate comes to, in parts; where the money goes and why stay beside them. */
@Component({
  selector: 'app-price-page',
  imports: [
    AlternativesPart,
    CardPart,
    ExtrasPart,
    FindingList,
    MatButton,
    MoneyBar,
    PartList,
    PartPlace,
    PresentationChoice,
    PriceLines,
    ProfitForm,
    StagesPart,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [CardsInUse, PlaceExplanation, PriceParts],
  templateUrl: './price-page.html',
  styleUrl: './price-page.scss',
})
export class PricePage {
  private readonly formats = inject(Formats);
  private readonly names = inject(PriceNames);
  protected readonly store = inject(EstimateStore);
  protected readonly parts = inject(PriceParts);

  /** The part the address asks for. */
  readonly part = input<string>();

  protected readonly sumsOnly = signal(false);
  protected readonly open = computed<PricePartKey>(() => {
    const offered = this.parts.parts().map(({ key }) => key);
    return pricePartKeys.find((key) => key === this.part() && offered.includes(key)) ?? 'lines';
  });
  protected readonly heading = computed(() => this.parts.parts().find(({ key }) => key === this.open())?.name ?? '');
  protected readonly memberNames = computed(() => new Map(this.store.members().map(({ id, name }) => [id, name])));
  protected readonly presentation = computed(() => this.store.settings()?.presentation ?? 'members');
  /** The cost side, for those who may see it. */
  protected readonly cost = computed(() => this.store.costed()?.cost.price);
  protected readonly findings = computed(() => this.store.costed()?.cost.findings ?? []);
  /** Names of the alternatives the figures are shown with. */
  protected readonly choice = computed(() => {
    const chosen = this.store.choice();
    const alternatives = this.store.settings()?.alternatives ?? [];
    return alternatives.filter(({ id }) => chosen.includes(id)).map(({ name }) => name);
  });
  protected readonly taxName = computed(() => this.names.taxOf(this.store.card()?.money.taxCategories));
  /** What the place is about: what is left of the price, or for the office how it adds up. */
  private readonly about = computed<Explained | undefined>(() => {
    const [priced, cost] = [this.store.priced(), this.cost()];
    if (cost) return profitExplained(this.formats, cost);
    return (
      priced && { id: 'sum net', heading: this.formats.money(priced.price.net_minor), reasons: priced.price.reasons }
    );
  });

  constructor() {
    inject(PlaceExplanation).follow(this.about);
  }

  protected present(presentation: 'members' | 'kinds'): void {
    this.store.changeSettings({ presentation });
  }
}
