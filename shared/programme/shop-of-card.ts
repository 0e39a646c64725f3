import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Shop } from '#shared/programme/shop';

const start_minutes = 8 * 60;
const noon_minutes = 12 * 60 + 30;
const pause_minutes = 30;

/** From eight in the morning with half an hour at half past twelve, so many hours in all. */
function startHours(day_minutes: number): Shop['hours'][number] {
  const before = Math.min(day_minutes, noon_minutes - start_minutes);
  const after = Math.min(day_minutes - before, 1440 - noon_minutes - pause_minutes);
  const morning = { start_minutes, end_minutes: start_minutes + before };
  const from_minutes = noon_minutes + pause_minutes;
  return after > 0 ? [morning, { start_minutes: from_minutes, end_minutes: from_minutes + after }] : [morning];
}

/** Half as much again for an hour of overtime (common practice, no source). */
const usualOvertime_percent = 50;

/** What is assumed of a workshop that has entered nothing yet: the card's working day and days, one hand of every grade, no racks; ids by the caller. */
export function shopOfCard({ buildUps, drying, money }: RateCard, newId: () => string): Shop {
  const hours = startHours(Math.round(buildUps.workingDay_hours * 60));
  return {
    hours: Array.from({ length: 7 }, (_, day) => (day < drying.workingDays ? hours : [])),
    productiveShare_percent: buildUps.productiveShare_percent,
    overtime_percent: usualOvertime_percent,
    days: [],
    climates: [],
    places: [],
    people: money.grades.map(({ id, name }) => ({
      ...{ id: newId(), name, gradeIds: [id], hours: null, absences: [], membershipId: null },
    })),
  };
}
