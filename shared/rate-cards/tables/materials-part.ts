import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart } from '#shared/rate-cards/tables/card-table';
import { choiceColumn, decimalColumn, itemColumn, nameColumn, numberColumn } from '#shared/rate-cards/tables/columns';

/** What is bought by the kilogram and the litre, and what is mixed of it. */
export const materialsPart: CardPart = {
  id: 'materials',
  heading: 'card-part-materials',
  tables: [
    {
      kind: 'list',
      id: 'materials',
      heading: 'card-table-materials',
      place: 'buildUps.materials',
      hasIds: true,
      columns: [
        nameColumn,
        choiceColumn('unit', 'bought-by', { choices: choicesOf('unit-of', ['kg', 'L']) }),
        decimalColumn('pricePerUnit', 'unit-price', { unit: 'money' }),
        numberColumn('bulk_kg_L', 'bulk', { unit: 'kilograms', empty: 'null' }),
      ],
    },
    {
      kind: 'list',
      id: 'material-packs',
      heading: 'card-table-material-packs',
      place: 'buildUps.materials.*.packs',
      hasIds: true,
      within: 'materials',
      columns: [decimalColumn('size', 'pack-size'), decimalColumn('price', 'pack-price', { unit: 'money' })],
    },
    {
      kind: 'list',
      id: 'recipes',
      heading: 'card-table-recipes',
      place: 'buildUps.recipes',
      hasIds: true,
      columns: [nameColumn],
    },
    {
      kind: 'list',
      id: 'recipe-parts',
      heading: 'card-table-recipe-parts',
      place: 'buildUps.recipes.*.parts',
      hasIds: true,
      within: 'recipes',
      columns: [
        nameColumn,
        choiceColumn('role', 'role', { choices: choicesOf('role', ['glue', 'water', 'other']) }),
        itemColumn('materialId', 'material', { items: 'material', empty: 'null' }),
        numberColumn('parts', 'parts'),
      ],
    },
    {
      kind: 'form',
      id: 'material-buying',
      heading: 'card-table-material-buying',
      columns: [
        choiceColumn('buildUps.buying', 'buying', { choices: choicesOf('buying', ['whole-packs', 'pro-rata']) }),
      ],
    },
  ],
};
