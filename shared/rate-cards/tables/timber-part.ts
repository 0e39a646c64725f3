import { recuttingManners } from '#shared/carving/carving-card';
import { planCurves } from '#shared/carving/plan-curve';
import { reliefs } from '#shared/measure/relief';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart, GridRow } from '#shared/rate-cards/tables/card-table';
import { decimalColumn, itemColumn, nameColumn, numberColumn } from '#shared/rate-cards/tables/columns';
import type { WordCode } from '#shared/words/word-code';

const rowsOf = (choices: readonly { readonly value: string; readonly word: WordCode }[]): GridRow[] =>
  choices.map(({ value, word }) => ({ key: value, words: [word] }));

/** What timber, relief and curves do to hours and surfaces. */
export const timberPart: CardPart = {
  id: 'timber',
  heading: 'card-part-timber',
  tables: [
    {
      kind: 'list',
      id: 'timbers',
      heading: 'card-table-timbers',
      place: 'carving.timbers',
      hasIds: true,
      columns: [
        nameColumn,
        numberColumn('factor', 'timber-factor'),
        numberColumn('radialCoefficient', 'radial'),
        numberColumn('tangentialCoefficient', 'tangential'),
        numberColumn('density_kgm3', 'density', { unit: 'density', empty: 'null' }),
        numberColumn('sideHardness_newtons', 'hardness', { unit: 'newtons', empty: 'null' }),
      ],
    },
    {
      kind: 'list',
      id: 'timber-prices',
      heading: 'card-table-timber-prices',
      place: 'money.making.timbers',
      hasIds: true,
      columns: [
        nameColumn,
        itemColumn('timberId', 'timber', { items: 'timber' }),
        decimalColumn('pricePerDm3', 'timber-price', { unit: 'money' }),
      ],
    },
    {
      kind: 'grid',
      id: 'reliefs',
      heading: 'card-table-reliefs',
      rows: rowsOf(choicesOf('relief', reliefs)),
      columns: [
        numberColumn('measure.reliefFactors.*', 'true-surface'),
        numberColumn('carving.reliefFactors.*', 'carving-hours'),
      ],
    },
    {
      kind: 'grid',
      id: 'plans',
      heading: 'card-table-plans',
      rows: rowsOf(choicesOf('plan', planCurves)),
      columns: [
        numberColumn('carving.planFactors.*', 'ornament-on-plan'),
        numberColumn('carving.blankPlanFactors.*', 'blank-on-plan'),
      ],
    },
    {
      kind: 'grid',
      id: 'recutting',
      heading: 'card-table-recutting',
      rows: rowsOf(choicesOf('recutting', recuttingManners)),
      columns: [
        numberColumn('carving.recutting.*.share_percent', 'recut-share', { unit: 'percent' }),
        numberColumn('carving.recutting.*.hours_per_m2', 'recut-area', { unit: 'hours' }),
      ],
    },
    {
      kind: 'form',
      id: 'factors',
      heading: 'card-table-factors',
      columns: [
        itemColumn('carving.recutting.gradeId', 'recutting-grade', { items: 'grade' }),
        numberColumn('measure.measuredInTheRoundFactor', 'measured-round'),
      ],
    },
  ],
};
