import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { scopeTexts } from '#shared/estimates/scope-texts';
import { reasonOutsideTax } from '#shared/money/is-outside-tax';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { EstimateStore } from '../estimate-store';
import { AlternativeTotals } from '../price/alternative-totals';
import { PriceLines } from '../price/price-lines';
import { PriceNames } from '../price/price-names';
import { IssueParts } from './issue-parts';
import { Letterhead } from './letterhead';
import { Validity } from './validity';

/** What the client's paper will say: letterhead, lines without cost, alternatives, texts, until when prices hold. */
@Component({
  selector: 'app-paper-preview',
  imports: [PriceLines],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './paper-preview.html',
  styleUrl: './paper-preview.scss',
})
export class PaperPreview {
  private readonly formats = inject(Formats);
  private readonly totals = inject(AlternativeTotals);
  private readonly validity = inject(Validity);
  private readonly names = inject(PriceNames);
  private readonly words = inject(Words);
  protected readonly store = inject(EstimateStore);
  protected readonly parts = inject(IssueParts);
  protected readonly letterhead = inject(Letterhead);

  protected readonly today = computed(() => this.formats.day(this.validity.today()));
  protected readonly until = computed(() => this.formats.day(this.validity.until()));
  protected readonly leafUntil = computed(() => this.formats.day(this.validity.leafUntil()));
  protected readonly reach = computed(() => {
    const workshop = this.letterhead.workshop();
    return [workshop?.telephone, workshop?.email].filter(Boolean).join(' · ');
  });
  protected readonly memberNames = computed(() => new Map(this.store.members().map(({ id, name }) => [id, name])));
  /** Alternatives with nothing in them stay off the papers. */
  private readonly empty = computed(() => {
    const findings = this.store.figures()?.findings ?? [];
    return new Set(findings.filter(({ code }) => code === 'alternative-empty').map(({ about }) => about));
  });
  protected readonly alternatives = computed(() =>
    (this.store.settings()?.alternatives ?? [])
      .filter(({ id }) => !this.empty().has(id))
      .map(({ id, name, note }) => ({
        id,
        name,
        note,
        difference: this.difference(this.totals.totals().get(id)?.difference_minor),
      })),
  );
  protected readonly taxName = computed(() => this.names.taxOf(this.store.card()?.money.taxCategories));
  /** Why nothing is taxed at all, as far as the reader knows the card. */
  protected readonly untaxed = computed(() => {
    const categories = this.store.card()?.money.taxCategories ?? [];
    const reasonOf = (id: string) => categories.find((one) => one.id === id)?.exemptionReason ?? '';
    const taxes = this.store.priced()?.price.taxes ?? [];
    return reasonOutsideTax(
      taxes.map(({ tax, taxCategoryId }) => ({ code: tax.code, exemptionReason: reasonOf(taxCategoryId) })),
    );
  });
  private readonly scope = computed(() => {
    const [draft, choice, lines] = [this.store.draft(), this.store.choice(), this.store.priced()?.price.lines];
    if (!draft || !lines) return { included: '', excluded: '' };
    return scopeTexts({ draft, choice, lines }, (code, values) => this.words.say(code, values));
  });
  protected readonly texts = computed(() => {
    const { terms = '' } = this.store.settings() ?? {};
    const { included, excluded } = this.scope();
    const all = [
      { heading: $localize`Included`, text: included },
      { heading: $localize`Not included`, text: excluded },
      { heading: $localize`Terms`, text: terms },
    ];
    return all.filter(({ text }) => text.trim() !== '');
  });

  private difference(difference_minor: number | undefined): string {
    if (difference_minor === undefined) return '';
    if (difference_minor === 0) return $localize`at the same price`;
    return this.formats.signed(difference_minor, (size_minor) => this.formats.money(size_minor));
  }
}
