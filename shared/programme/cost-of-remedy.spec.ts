import { costOfRemedy } from '#shared/programme/cost-of-remedy';
import { programmeFrame } from '#shared/programme/programme-frame';
import { programmeRemedies } from '#shared/programme/programme-remedies';
import type { ProgrammeTask } from '#shared/programme/programme-request';
import { lagForSpecs, requestForSpecs, taskForSpecs } from '#shared/programme/request-for-specs';
import type { WordCode } from '#shared/words/word-code';

const frame = programmeFrame('2027-01-04', 'Europe/Berlin');
const rates = [{ gradeId: 'gilder', costPerHour: '33.00' }];
const known = { frame, rates, setUp_hours: 0.5, digits: 2, overtime_percent: 50 };

/** A task that takes nine hours in one go, where a day has eight. */
const nineHours = (changes: Partial<ProgrammeTask> = {}) =>
  requestForSpecs({ tasks: [taskForSpecs('lay', { handsOn_minutes: 540, isBreakable: false, ...changes })] });

function costs(
  request: ReturnType<typeof nineHours>,
  { sizeDifference_minor = 0, overtime_percent = 50 } = {},
): Map<WordCode, number | null> {
  const remedies = programmeRemedies(request, 'lay', { otherSizes: [] });
  return new Map(
    remedies.map((remedy) => [
      remedy.code,
      costOfRemedy(remedy, { ...known, request, sizeDifference_minor, overtime_percent }),
    ]),
  );
}

describe('What a remedy costs', () => {
  it('is the premium of every hour beyond those people have: one hour at 33.00, half as much again, is 16.50', () => {
    expect(costs(nineHours()).get('programme-remedy-longer-day')).toBe(1650);
  });

  it.each([
    [0, 0],
    [25, 825],
    [33.3, 1099],
    [100, 3300],
  ])('at the workshop’s own premium of %d %% is %d minor units for that hour', (overtime_percent, expected) => {
    expect(costs(nineHours(), { overtime_percent }).get('programme-remedy-longer-day')).toBe(expected);
  });

  it('is the set-up of each further day of portions: two halves of four and a half hours go on two days', () => {
    expect(costs(nineHours()).get('programme-remedy-portions')).toBe(1650);
    const short = nineHours({ handsOn_minutes: 500 });
    // Four hours and ten minutes twice are more than a day; for a crew of two both are set up again.
    const pair = requestForSpecs({
      ...short,
      tasks: [taskForSpecs('lay', { handsOn_minutes: 500, isBreakable: false, crew: 2, mostPeople: 2 })],
      people: ['gina', 'gwen'].map((id) => ({ ...short.people[0], id })),
    });
    expect(costs(pair).get('programme-remedy-portions')).toBe(3300);
  });

  it('is the set-up of whoever comes to help, once for each day of the task', () => {
    // Two share nine hours in four and a half, on one day.
    const shared = costs(nineHours({ mostPeople: 2 }));
    expect(shared.get('programme-remedy-further-hands')).toBe(1650);
  });

  it('is not told where it does not help', () => {
    expect(costs(nineHours({ handsOn_minutes: 1200 })).get('programme-remedy-longer-day')).toBeNull();
  });

  it('holds what the estimate says another size makes of it, more or less', () => {
    const request = requestForSpecs({
      tasks: [taskForSpecs('size'), taskForSpecs('lay', { handsOn_minutes: 240, isBreakable: false })],
      lags: [lagForSpecs('size', 'lay', { id: 'size>lay:dry', least: 180, most: 200 })],
    });
    const slow = { name: 'Slow', lags: [lagForSpecs('size', 'lay', { id: 'size>lay:dry', least: 720, most: 1440 })] };
    const remedies = programmeRemedies(request, 'size', { otherSizes: [slow] });
    const remedy = remedies.find(({ code }) => code === 'programme-remedy-other-size');
    const cost = (sizeDifference_minor: number) =>
      remedy && costOfRemedy(remedy, { ...known, request, sizeDifference_minor });
    expect([cost(0), cost(1234), cost(-250)]).toEqual([0, 1234, -250]);
  });
});
