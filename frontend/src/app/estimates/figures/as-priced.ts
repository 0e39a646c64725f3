import type { Figures, PricedFigures } from '#shared/estimates/figures';
import type { ReaderFigures } from './live-figures';

/** The figures with their prices, where the reader was sent them. */
export const asPriced = (figures: ReaderFigures | undefined): PricedFigures | undefined =>
  figures && 'price' in figures ? figures : undefined;

/** The figures with their cost, where the reader was sent it. */
export const asCosted = (figures: ReaderFigures | undefined): Figures | undefined =>
  figures && 'cost' in figures ? figures : undefined;
