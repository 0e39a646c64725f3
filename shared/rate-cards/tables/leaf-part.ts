import { leafCharges } from '#shared/leaf/leaf-card';
import { alloyMetals, leafForms, leafMetals } from '#shared/leaf/leaf-product';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart } from '#shared/rate-cards/tables/card-table';
import { choiceColumn, decimalColumn, nameColumn, numberColumn } from '#shared/rate-cards/tables/columns';

const alloyColumns = alloyMetals.map((metal) =>
  numberColumn(`alloy.${metal}`, `alloy-${metal}`, { unit: 'parts', empty: 'absent' }),
);

/** The leaf a workshop lays: what it is, and what it costs by the booklet and by the pack. */
export const leafPart: CardPart = {
  id: 'leaf',
  heading: 'card-part-leaf',
  tables: [
    {
      kind: 'list',
      id: 'leaf',
      heading: 'card-table-leaf',
      place: 'leaf.products',
      hasIds: true,
      columns: [
        nameColumn,
        choiceColumn('metal', 'metal', { choices: choicesOf('metal', leafMetals) }),
        choiceColumn('form', 'form', { choices: choicesOf('form', leafForms) }),
        numberColumn('carat', 'carat', { empty: 'null' }),
        numberColumn('side_mm', 'side', { unit: 'mm' }),
        numberColumn('leavesPerBooklet', 'leaves-per-booklet'),
        decimalColumn('price', 'booklet-price', { unit: 'money' }),
        numberColumn('gramsPerThousand', 'grams', { unit: 'grams' }),
        numberColumn('thickness_micrometres', 'thickness', { unit: 'micrometres', empty: 'null' }),
        numberColumn('ribbon_mm', 'ribbon', { unit: 'mm', empty: 'null' }),
        ...alloyColumns,
      ],
    },
    {
      kind: 'list',
      id: 'leaf-packs',
      heading: 'card-table-leaf-packs',
      place: 'leaf.products.*.breaks',
      hasIds: false,
      within: 'leaf',
      columns: [numberColumn('booklets', 'pack-booklets'), decimalColumn('off_percent', 'off', { unit: 'percent' })],
    },
    {
      kind: 'form',
      id: 'leaf-buying',
      heading: 'card-table-leaf-buying',
      columns: [
        choiceColumn('leaf.charge', 'charge', { choices: choicesOf('charge', leafCharges) }),
        numberColumn('leaf.orderPercentile', 'order-percentile'),
        numberColumn('leaf.spare_percent', 'spare', { unit: 'percent' }),
        numberColumn('money.leafPricesHold_days', 'leaf-prices-hold', { unit: 'days' }),
      ],
    },
  ],
};
