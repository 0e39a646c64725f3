import { leafFinishes, layingWays } from '#shared/leaf/leaf-card';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart, GridRow } from '#shared/rate-cards/tables/card-table';
import { numberColumn } from '#shared/rate-cards/tables/columns';

const ways = choicesOf('laying', layingWays);
const wayRows: GridRow[] = ways.map(({ value, word }) => ({ key: value, words: [word] }));
const finishRows: GridRow[] = choicesOf('leaf-finish', leafFinishes).flatMap((finish) =>
  ways.map((way) => ({ key: `${finish.value}.${way.value}`, words: [finish.word, way.word] })),
);
const percent = { unit: 'percent' } as const;

/** How leaf laps, and how much of it is lost. */
export const lossesPart: CardPart = {
  id: 'losses',
  heading: 'card-part-losses',
  tables: [
    {
      kind: 'grid',
      id: 'laying',
      heading: 'card-table-laying',
      rows: wayRows,
      columns: [
        numberColumn('leaf.laps_mm.*', 'lap', { unit: 'mm' }),
        numberColumn('leaf.losses.*.breakage_percent.low', 'breakage-low', percent),
        numberColumn('leaf.losses.*.breakage_percent.likely', 'breakage-likely', percent),
        numberColumn('leaf.losses.*.breakage_percent.high', 'breakage-high', percent),
        numberColumn('leaf.losses.*.faulting_percent.low', 'faulting-low', percent),
        numberColumn('leaf.losses.*.faulting_percent.likely', 'faulting-likely', percent),
        numberColumn('leaf.losses.*.faulting_percent.high', 'faulting-high', percent),
      ],
    },
    {
      kind: 'grid',
      id: 'second-laying',
      heading: 'card-table-second-laying',
      rows: finishRows,
      columns: [
        numberColumn('leaf.secondLaying_percent.*.low', 'low', percent),
        numberColumn('leaf.secondLaying_percent.*.likely', 'likely', percent),
        numberColumn('leaf.secondLaying_percent.*.high', 'high', percent),
      ],
    },
    {
      kind: 'form',
      id: 'cuts',
      heading: 'card-table-cuts',
      columns: [numberColumn('leaf.patchCuts', 'patch-cuts')],
    },
  ],
};
