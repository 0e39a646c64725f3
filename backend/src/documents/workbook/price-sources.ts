import type { CarvingPage } from './carving-sheet';
import type { ExtrasPage } from './extras-sheet';
import type { GildingPage } from './gilding-sheet';
import type { MoneyRates } from './money-rates';
import type { PriceColumns } from './price-columns';
import type { SetUpPage } from './set-up-sheet';
import type { SharedOutPage } from './shared-out-sheet';
import type { Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The pages a price is drawn together from. */
export interface PriceSources {
  readonly carving: CarvingPage;
  readonly gilding: GildingPage;
  readonly setUp: SetUpPage;
  readonly sharedOut: SharedOutPage;
  readonly extras: ExtrasPage;
  readonly money: MoneyRates;
}

/** The price while it is being written. */
export interface PricePage extends PriceSources {
  readonly sheet: Sheet;
  readonly facts: WorkbookFacts;
  readonly columns: PriceColumns;
  /** Minor units in one of the currency. */
  readonly scale: number;
  /** The row of rates over the lines. */
  readonly rateRow: number;
}
