import { addDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import type { Shop, ShopPerson } from '#shared/programme/shop';

/** Hours of the wall clock, decimal. */
const span = (from_hours: number, to_hours: number) => ({ start_minutes: from_hours * 60, end_minutes: to_hours * 60 });
const fullDay = [span(8, 12.5), span(13, 16.5)];
const shortDay = [span(8, 13)];

/** A workshop by the sea, heated in winter: twelve invented months from January on. */
const climates = [
  [16, 46],
  [16, 46],
  [17, 48],
  [17, 50],
  [18, 54],
  [19, 58],
  [21, 60],
  [21, 62],
  [19, 60],
  [18, 56],
  [17, 50],
  [16, 48],
].map(([temperature_celsius, humidity_percent]) => ({ temperature_celsius, humidity_percent }));

const id = (number: number): string => `0192d000-0000-7000-8000-${String(number).padStart(12, '0')}`;

/** Who may sign in among those at the bench, by the name of their account. */
export type Memberships = ReadonlyMap<string, string>;

/** Three invented people; the improver does not sign in and is at evening school on Thursdays and Fridays. */
function people(today: Day, memberships: Memberships): ShopPerson[] {
  const own = (name: string) => memberships.get(name) ?? null;
  const away = { id: id(31), firstDay: addDays(today, 24), lastDay: addDays(today, 28), note: 'Leave' };
  return [
    {
      ...{ id: id(11), name: 'Jonah Pikesley', gradeIds: ['master-carver', 'carver'], hours: null },
      ...{ absences: [], membershipId: own('Jonah Pikesley') },
    },
    {
      ...{ id: id(12), name: 'Tobias Wrenfield', gradeIds: ['gilder', 'finisher'], hours: null },
      ...{ absences: [away], membershipId: own('Tobias Wrenfield') },
    },
    {
      ...{ id: id(13), name: 'Pelham Rusk', gradeIds: ['improver', 'finisher'] },
      ...{ hours: [fullDay, fullDay, fullDay, shortDay, shortDay, [], []], absences: [], membershipId: null },
    },
  ];
}

/** What the demonstration workshop has to work with: four days and a short Friday, closed between the years, a rack for three lots. */
export function demonstrationShop(today: Day, memberships: Memberships): Shop {
  const year = Number(today.slice(0, 4));
  const closed = [year, year + 1].map((from, at) => ({
    ...{ id: id(21 + at), name: 'Closed between the years', hours: [] },
    ...{ firstDay: `${String(from)}-12-24`, lastDay: `${String(from + 1)}-01-02` },
  }));
  return {
    hours: [fullDay, fullDay, fullDay, fullDay, shortDay, [], []],
    productiveShare_percent: 75,
    overtime_percent: 50,
    days: closed,
    climates,
    places: [
      { id: id(41), name: 'Drying rack', kind: 'rack', capacity: 3 },
      { id: id(42), name: 'Carving bench', kind: 'bench', capacity: 2 },
    ],
    people: people(today, memberships),
  };
}
