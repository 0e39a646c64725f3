import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardForm, CardPart } from '#shared/rate-cards/tables/card-table';
import { choiceColumn, decimalColumn, itemColumn, nameColumn, numberColumn } from '#shared/rate-cards/tables/columns';

const percent = { unit: 'percent' } as const;
const hours = { unit: 'hours' } as const;
const grade = { items: 'grade' } as const;

const priceForm: CardForm = {
  kind: 'form',
  id: 'price',
  heading: 'card-table-price',
  columns: [
    choiceColumn('money.overhead.way', 'overhead-way', {
      choices: choicesOf('overhead', ['per-hour', 'share-of-labour']),
    }),
    decimalColumn('money.overhead.perHour', 'overhead-hour', { unit: 'money', empty: 'absent' }),
    decimalColumn('money.overhead.percent', 'overhead-share', { unit: 'percent', empty: 'absent' }),
    choiceColumn('money.contingency.way', 'contingency-way', {
      choices: choicesOf('contingency', ['share', 'risk']),
    }),
    decimalColumn('money.contingency.percent', 'contingency-share', percent),
    numberColumn('money.contingency.percentile', 'percentile'),
    choiceColumn('money.contingency.distribution', 'distribution', {
      choices: choicesOf('distribution', ['triangular', 'pert']),
    }),
    numberColumn('money.contingency.commonFactor', 'common-factor'),
    choiceColumn('money.profit.way', 'profit-way', { choices: choicesOf('profit', ['margin', 'mark-up']) }),
    decimalColumn('money.profit.percent', 'profit-percent', percent),
    decimalColumn('money.consumables_percent', 'consumables', percent),
  ],
};

const extrasForm: CardForm = {
  kind: 'form',
  id: 'extras',
  heading: 'card-table-extras',
  columns: [
    numberColumn('money.extras.sampleBoard.hours', 'sample-hours', hours),
    itemColumn('money.extras.sampleBoard.gradeId', 'sample-grade', grade),
    numberColumn('money.extras.sampleBoard.booklets', 'sample-booklets'),
    itemColumn('money.extras.sampleBoard.leafProductId', 'sample-leaf', { items: 'leaf' }),
    numberColumn('money.extras.packing.hours', 'packing-hours', hours),
    itemColumn('money.extras.packing.gradeId', 'packing-grade', grade),
    decimalColumn('money.extras.packing.crate', 'packing-crate', { unit: 'money' }),
    numberColumn('money.extras.fitting.people', 'fitting-people'),
    numberColumn('money.extras.fitting.hours', 'fitting-hours', hours),
    itemColumn('money.extras.fitting.gradeId', 'fitting-grade', grade),
    numberColumn('money.extras.touchingIn.hours', 'touching-hours', hours),
    itemColumn('money.extras.touchingIn.gradeId', 'touching-grade', grade),
    decimalColumn('money.extras.insurance_percent', 'insurance', percent),
  ],
};

/** What is added to cost on the way to a price, what is charged besides, and how it is paid. */
export const moneyPart: CardPart = {
  id: 'money',
  heading: 'card-part-money',
  tables: [
    priceForm,
    extrasForm,
    {
      kind: 'form',
      id: 'making',
      heading: 'card-table-making',
      columns: [
        numberColumn('money.making.waste_percent', 'waste', percent),
        itemColumn('money.making.joineryGradeId', 'joinery-grade', grade),
        itemColumn('money.making.turningGradeId', 'turning-grade', grade),
      ],
    },
    {
      kind: 'form',
      id: 'terms',
      heading: 'card-table-terms',
      columns: [
        decimalColumn('money.terms.deposit_percent', 'deposit', percent),
        decimalColumn('money.terms.retention_percent', 'retention', percent),
      ],
    },
    {
      kind: 'list',
      id: 'payments',
      heading: 'card-table-payments',
      place: 'money.terms.stages',
      hasIds: true,
      columns: [nameColumn, decimalColumn('percent', 'stage-share', percent)],
    },
  ],
};
