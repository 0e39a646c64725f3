import type { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { waitingText } from './waiting-text';

/** Hands on and waiting, as columns of a table of work that dries. */
export const timeColumns = <R>(
  formats: Formats,
  handsOn: (row: R) => string,
  waiting_minutes: (row: R) => number,
): FigureColumn<R>[] => [
  { key: 'handsOn', heading: $localize`Hands on`.replaceAll(' ', '\u00a0'), kind: 'figure', text: handsOn },
  {
    key: 'waiting',
    heading: $localize`Waiting`,
    kind: 'figure',
    text: (row) => waitingText(formats, waiting_minutes(row)),
  },
];
