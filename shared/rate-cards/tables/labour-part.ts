import type { CardPart } from '#shared/rate-cards/tables/card-table';
import { decimalColumn, nameColumn, numberColumn } from '#shared/rate-cards/tables/columns';

/** What an hour costs, and how many of them there are in a day. */
export const labourPart: CardPart = {
  id: 'labour',
  heading: 'card-part-labour',
  tables: [
    {
      kind: 'list',
      id: 'grades',
      heading: 'card-table-grades',
      place: 'money.grades',
      hasIds: true,
      columns: [nameColumn, decimalColumn('costPerHour', 'cost-per-hour', { unit: 'money' })],
    },
    {
      kind: 'form',
      id: 'working-day',
      heading: 'card-table-working-day',
      columns: [
        numberColumn('buildUps.workingDay_hours', 'working-day', { unit: 'hours' }),
        numberColumn('buildUps.productiveShare_percent', 'productive-share', { unit: 'percent' }),
        numberColumn('buildUps.setUp_hours', 'set-up', { unit: 'hours' }),
        numberColumn('carving.sharpening_percent', 'sharpening', { unit: 'percent' }),
      ],
    },
  ],
};
