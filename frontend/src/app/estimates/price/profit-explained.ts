import type { PriceCost } from '#shared/estimates/price/price';
import type { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';

/** What is left of the price as profit, with the steps from the direct cost on. */
export const profitExplained = (formats: Formats, { profit_minor, reasons }: PriceCost): Explained => ({
  id: 'profit left',
  heading:
    profit_minor < 0
      ? $localize`${formats.money(-profit_minor)}:amount: below cost`
      : $localize`${formats.money(profit_minor)}:amount: profit`,
  reasons,
});
