import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';
import type { Person, ShopCalendar, WeekHours } from '#shared/programme/shop-calendar';

const day = [
  { start_minutes: 480, end_minutes: 720 },
  { start_minutes: 780, end_minutes: 1020 },
];
const round = [{ start_minutes: 0, end_minutes: 1440 }];

/** Eight hours from Monday to Friday with an hour's pause at noon. */
export const weekdayHours: WeekHours = { 1: day, 2: day, 3: day, 4: day, 5: day };

/** Day and night. */
export const endlessHours: WeekHours = { 1: round, 2: round, 3: round, 4: round, 5: round, 6: round, 7: round };

/** A calendar from Monday, 4 January 2027. */
export const calendarForSpecs = (week: WeekHours = weekdayHours): ShopCalendar => ({
  firstDay: '2027-01-04',
  week,
  exceptions: [],
  productiveShare_percent: 100,
  oddDays: [],
});

/** Somebody of the workshop's hours. */
export const personForSpecs = (id: string, ...gradeIds: string[]): Person => ({
  id,
  gradeIds,
  week: null,
  exceptions: [],
  away: [],
});

/** A task one person does, broken only overnight. */
export const taskForSpecs = (id: string, changes: Partial<ProgrammeTask> = {}): ProgrammeTask => ({
  id,
  name: id,
  lotId: 'lot',
  gradeId: 'gilder',
  handsOn_minutes: 60,
  crew: 1,
  mostPeople: 1,
  isBreakable: true,
  release_minutes: 0,
  pinned_minutes: null,
  happened: null,
  ...changes,
});

/** A lag from the end of one task to the start of another, by the clock. */
export const lagForSpecs = (
  fromTaskId: string,
  toTaskId: string,
  changes: Partial<ProgrammeLag> = {},
): ProgrammeLag => ({
  id: `${fromTaskId}-${toTaskId}`,
  fromTaskId,
  fromPoint: 'end',
  toTaskId,
  toPoint: 'start',
  least: 0,
  most: null,
  time: 'clock',
  paceId: null,
  ...changes,
});

/** A request of nothing but a calendar and one gilder. */
export const requestForSpecs = (changes: Partial<ProgrammeRequest> = {}): ProgrammeRequest => ({
  calendar: calendarForSpecs(),
  start_minutes: 0,
  tasks: [],
  lags: [],
  approvals: [],
  people: [personForSpecs('gina', 'gilder')],
  places: [],
  placeHolds: [],
  paces: [],
  ...changes,
});
