import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { currencyDigits } from '#shared/money/currency-digits';
import { sumMinor } from '#shared/money/sum-minor';
import { textOf } from '#shared/money/text-of';
import type { CardEffect } from '#shared/rate-cards/card-effects';
import type { WordCode } from '#shared/words/word-code';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { FindingList } from '../../ui/page/finding-list';

const change = ({ before_minor, after_minor }: CardEffect): number => after_minor - before_minor;

/** What a card does to each open estimate: price before and after, and the lines that move when one looks closer. */
@Component({
  selector: 'app-effects-table',
  imports: [FindingList, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './effects-table.html',
  styleUrl: './effects-table.scss',
})
export class EffectsTable {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly effects = input.required<readonly CardEffect[]>();

  private readonly opened = signal<ReadonlySet<string>>(new Set());
  protected readonly rows = computed(() =>
    this.effects().map((effect) => ({
      effect,
      isOpen: this.opened().has(effect.estimateId),
      before: this.money(effect.before_minor, effect.currency),
      after: this.money(effect.after_minor, effect.currency),
      difference: this.signed(change(effect), effect.currency),
      share: this.share(effect),
      lines: effect.lines.map((line) => ({
        id: line.lineId,
        name: [line.member, line.name ?? this.words.say(`work-kind-${line.kind}` as WordCode)]
          .filter(Boolean)
          .join(' · '),
        before: line.before_minor === null ? '–' : this.money(line.before_minor, effect.currency),
        after: line.after_minor === null ? '–' : this.money(line.after_minor, effect.currency),
        difference: this.signed((line.after_minor ?? 0) - (line.before_minor ?? 0), effect.currency),
      })),
    })),
  );
  /** Sums of each currency; there is nearly always one. */
  protected readonly totals = computed(() => {
    const currencies = [...new Set(this.effects().map(({ currency }) => currency))];
    return currencies.map((currency) => {
      const own = this.effects().filter((effect) => effect.currency === currency);
      const before_minor = sumMinor(own.map((effect) => effect.before_minor));
      const after_minor = sumMinor(own.map((effect) => effect.after_minor));
      return {
        currency,
        before: this.money(before_minor, currency),
        after: this.money(after_minor, currency),
        difference: this.signed(after_minor - before_minor, currency),
      };
    });
  });

  protected turn(estimateId: string): void {
    this.opened.update((opened) => {
      const turned = new Set(opened);
      if (!turned.delete(estimateId)) turned.add(estimateId);
      return turned;
    });
  }

  private share({ before_minor, after_minor }: CardEffect): string {
    if (before_minor === 0 || after_minor === before_minor) return '';
    const percent = ((after_minor - before_minor) / before_minor) * 100;
    return this.formats.signed(percent, (size) => this.formats.figure('percent', size));
  }

  private signed(amount_minor: number, currency: string): string {
    return this.formats.signed(amount_minor, (size_minor) => this.money(size_minor, currency));
  }

  /** An estimate keeps the currency it was begun in, whatever the workshop's is now. */
  private money(amount_minor: number, currency: string): string {
    const digits = currencyDigits(currency);
    const format = new Intl.NumberFormat(this.formats.locale(), {
      style: 'currency',
      currency,
      numberingSystem: 'latn',
      minimumFractionDigits: digits,
      maximumFractionDigits: digits,
    });
    // A decimal text is formatted digit by digit, where a division would make a float of it.
    return format.format(textOf(amount_minor, digits) as unknown as number);
  }
}
