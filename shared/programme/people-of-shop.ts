import { addDays } from '#shared/calendar/add-days';
import { minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import { pooledPlaces } from '#shared/programme/pooled-places';
import type { PromisedWork } from '#shared/programme/promised-work';
import type { Shop, ShopPerson } from '#shared/programme/shop';
import { weekHours } from '#shared/programme/shop-calendar-of';
import type { MomentSpan, Person } from '#shared/programme/shop-calendar';
import type { Place } from '#shared/programme/programme-request';

const absencesOf = ({ absences }: ShopPerson, frame: ProgrammeFrame): MomentSpan[] =>
  absences.map(({ firstDay, lastDay }) => ({
    start_minutes: minutesOfDay(firstDay, frame),
    end_minutes: minutesOfDay(addDays(lastDay, 1), frame),
  }));

function promisedSpans(personId: string, promised: readonly PromisedWork[]): MomentSpan[] {
  return promised.flatMap(({ people }) =>
    people
      .filter((work) => work.personId === personId)
      .map(({ start_minutes, end_minutes }) => ({ start_minutes, end_minutes })),
  );
}

/** The people of a workshop as a programme plans with them: away on absences and while they are promised elsewhere. Closed days are closed to all. */
export const peopleOfShop = (shop: Shop, frame: ProgrammeFrame, promised: readonly PromisedWork[]): Person[] =>
  shop.people.map((person) => ({
    id: person.id,
    gradeIds: person.gradeIds,
    week: person.hours ? weekHours(person.hours) : null,
    exceptions: [],
    away: [...absencesOf(person, frame), ...promisedSpans(person.id, promised)],
  }));

/** Racks and benches, each kind as one, with what of them is promised elsewhere. */
export const placesOfShop = (shop: Shop, promised: readonly PromisedWork[]): Place[] =>
  pooledPlaces(shop).map(({ id, name, capacity, placeIds }) => ({
    ...{ id, name, capacity },
    taken: promised.flatMap(({ places }) =>
      places
        .filter((work) => placeIds.includes(work.placeId))
        .map(({ start_minutes, end_minutes, amount }) => ({ start_minutes, end_minutes, amount })),
    ),
  }));
