import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart } from '#shared/rate-cards/tables/card-table';
import { numberColumn } from '#shared/rate-cards/tables/columns';

const workingDays = { unit: 'working-days' } as const;

/** The air things dry in, and what has to be waited for. */
export const dryingPart: CardPart = {
  id: 'drying',
  heading: 'card-part-drying',
  tables: [
    {
      kind: 'grid',
      id: 'climates',
      heading: 'card-table-climates',
      rows: choicesOf('room', ['shop', 'site']).map(({ value, word }) => ({ key: value, words: [word] })),
      columns: [
        numberColumn('drying.*.temperature_celsius', 'temperature', { unit: 'celsius' }),
        numberColumn('drying.*.humidity_percent', 'humidity', { unit: 'percent' }),
      ],
    },
    {
      kind: 'list',
      id: 'oil-humidity',
      heading: 'card-table-oil-humidity',
      place: 'drying.oilHumidity',
      hasIds: false,
      columns: [numberColumn('humidity_percent', 'humidity', { unit: 'percent' }), numberColumn('factor', 'slower')],
    },
    {
      kind: 'form',
      id: 'drying',
      heading: 'card-table-drying',
      columns: [
        numberColumn('drying.leastFactor', 'least-factor'),
        numberColumn('drying.mostFactor', 'most-factor'),
        numberColumn('drying.holds_days.carving-approved', 'hold-carving', workingDays),
        numberColumn('drying.holds_days.sample-approved', 'hold-sample', workingDays),
        numberColumn('drying.holds_days.top-dry-fitted', 'hold-top', workingDays),
        numberColumn('drying.workingDays', 'working-days', { unit: 'days' }),
        numberColumn('drying.moistureWarning_points', 'moisture-warning'),
        numberColumn('drying.jointWarning_mm', 'joint-warning', { unit: 'mm' }),
      ],
    },
  ],
};
