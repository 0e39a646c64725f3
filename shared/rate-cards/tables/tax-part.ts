import { taxCodes } from '#shared/money/tax-codes';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart } from '#shared/rate-cards/tables/card-table';
import { choiceColumn, decimalColumn, itemColumn, nameColumn, textColumn } from '#shared/rate-cards/tables/columns';

/** The categories of tax a line may bear. */
export const taxPart: CardPart = {
  id: 'tax',
  heading: 'card-part-tax',
  tables: [
    {
      kind: 'list',
      id: 'tax',
      heading: 'card-table-tax',
      place: 'money.taxCategories',
      hasIds: true,
      columns: [
        nameColumn,
        choiceColumn('code', 'tax-code', { choices: choicesOf('tax-code', taxCodes) }),
        decimalColumn('percent', 'tax-percent', { unit: 'percent' }),
        textColumn('exemptionReason', 'exemption'),
      ],
    },
    {
      kind: 'form',
      id: 'tax-usual',
      heading: 'card-table-tax-usual',
      columns: [itemColumn('money.defaultTaxCategoryId', 'usual-tax', { items: 'tax' })],
    },
  ],
};
