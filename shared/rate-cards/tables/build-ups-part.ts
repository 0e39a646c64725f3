import { systems } from '#shared/buildups/buildup';
import { finishes } from '#shared/measure/relief';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart } from '#shared/rate-cards/tables/card-table';
import { choiceColumn, nameColumn, noteColumn, numberColumn } from '#shared/rate-cards/tables/columns';
import { lagColumns, stepColumns, useColumns } from '#shared/rate-cards/tables/step-columns';

const minutes = { unit: 'minutes' } as const;

/** The stacks of coats a workshop lays, step by step, and the time they take. */
export const buildUpsPart: CardPart = {
  id: 'build-ups',
  heading: 'card-part-build-ups',
  tables: [
    {
      kind: 'list',
      id: 'build-ups',
      heading: 'card-table-build-ups',
      place: 'buildUps.buildUps',
      hasIds: true,
      columns: [nameColumn, choiceColumn('system', 'system', { choices: choicesOf('system', systems) }), noteColumn],
    },
    {
      kind: 'list',
      id: 'steps',
      heading: 'card-table-steps',
      place: 'buildUps.buildUps.*.steps',
      hasIds: true,
      within: 'build-ups',
      columns: stepColumns,
    },
    {
      kind: 'list',
      id: 'uses',
      heading: 'card-table-uses',
      place: 'buildUps.buildUps.*.steps.*.uses',
      hasIds: false,
      within: 'steps',
      columns: useColumns,
    },
    {
      kind: 'list',
      id: 'lags',
      heading: 'card-table-lags',
      place: 'buildUps.buildUps.*.steps.*.drying.lags',
      hasIds: false,
      within: 'steps',
      columns: lagColumns,
    },
    {
      kind: 'grid',
      id: 'finishes',
      heading: 'card-table-finishes',
      rows: choicesOf('finish', finishes).map(({ value, word }) => ({ key: value, words: [word] })),
      columns: [
        numberColumn('buildUps.finishFactors.*', 'finish-factor'),
        numberColumn('buildUps.smoothingFactors.*', 'smoothing-factor'),
      ],
    },
    {
      kind: 'form',
      id: 'laying-minutes',
      heading: 'card-table-laying-minutes',
      columns: [
        numberColumn('buildUps.laying.sheets_minutes', 'sheets-minutes', minutes),
        numberColumn('buildUps.laying.lays_minutes', 'lays-minutes', minutes),
        numberColumn('buildUps.laying.patches_minutes', 'patches-minutes', minutes),
        numberColumn('buildUps.laying.ribbon_minutes_m', 'ribbon-minutes', minutes),
        numberColumn('buildUps.laying.onSizeFactor', 'on-size'),
        numberColumn('buildUps.laying.transferFlatFactor', 'transfer-flat'),
        numberColumn('buildUps.laying.transferCarvedFactor', 'transfer-carved'),
      ],
    },
    {
      kind: 'grid',
      id: 'ranges',
      heading: 'card-table-ranges',
      rows: [
        { key: 'paintedOrnament_hours_dm2', words: ['card-range-painted-ornament'] },
        { key: 'consolidating_hours_m2', words: ['card-range-consolidating'] },
        { key: 'cleaning_hours_m2', words: ['card-range-cleaning'] },
        { key: 'spread', words: ['card-range-spread'] },
      ],
      columns: [
        numberColumn('buildUps.*.low', 'low'),
        numberColumn('buildUps.*.likely', 'likely'),
        numberColumn('buildUps.*.high', 'high'),
      ],
    },
    {
      kind: 'form',
      id: 'other-work',
      heading: 'card-table-other-work',
      columns: [
        numberColumn('buildUps.protectingEdge_hours_m', 'protecting-edge', { unit: 'hours' }),
        numberColumn('buildUps.burnished_percent', 'burnished-share', { unit: 'percent' }),
        numberColumn('buildUps.groundLimit_mm', 'ground-limit', { unit: 'mm' }),
      ],
    },
  ],
};
