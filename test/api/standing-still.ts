import type { Api, TestWorkshop } from './start-api';

type Plant<T> = (workshop: TestWorkshop, api: Api) => Promise<T>;

const planted = new WeakMap<TestWorkshop, Map<unknown, Promise<unknown>>>();

/** A workshop as seen by tests that change none of its rows. */
export function standingStill(workshop: TestWorkshop): TestWorkshop {
  const still = { ...workshop };
  planted.set(still, new Map());
  return still;
}

/** Plants anew each time, but only once in a workshop that stands still. */
export const onceInWhatStandsStill =
  <T>(plant: Plant<T>): Plant<T> =>
  (workshop, api) => {
    const known = planted.get(workshop);
    const found = known?.get(plant) ?? plant(workshop, api);
    known?.set(plant, found);
    return found as Promise<T>;
  };
