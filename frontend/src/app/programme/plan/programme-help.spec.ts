import { TestBed } from '@angular/core/testing';
import { programme } from '#shared/programme/programme';
import { signIn, words } from '../../../test/sign-in';
import { AnsweringForSpecs } from '../answering-for-specs';
import { settledForSpecs } from '../settled-for-specs';
import { NOW } from '../../core/now';
import { Planner } from './planner';
import { PlanningHereForSpecs } from './planning-here-for-specs';
import { PLANNING_STARTER } from './planning-starter';
import { programmeForSpecs } from './programme-for-specs';
import { ProgrammePlanning } from './programme-planning';
import { ProgrammeStore } from './programme-store';
import { asItIs, WhatIfComparison, type AskedWay } from './what-if-comparison';

const stands = programmeForSpecs();
const day = 1440;

const rates = ['carver', 'gilder'].map((gradeId) => ({ gradeId, costPerHour: '30.00' }));

async function opened(
  read = stands,
  worker: () => EventTarget = () => new PlanningHereForSpecs(),
  from_minutes = 3 * day,
) {
  const { firstDay, startsAt, timeZone, request, items } = read;
  const server = new AnsweringForSpecs({
    readProgramme: () => read,
    readShop: () => ({ content: { people: [] } }),
    readWhatIf: () => ({
      ...{ firstDay, startsAt, timeZone, items, findings: [], rates, setUp_hours: 0, digits: 2, overtime_percent: 40 },
      request: { ...request, start_minutes: from_minutes },
      ...{ cost_minor: 100_000, costDifference_minor: 0, gross_minor: 150_000, grossDifference_minor: 0 },
    }),
  });
  const starter = { provide: PLANNING_STARTER, useValue: () => Promise.resolve(worker()) };
  // Before the workshop opens on the first day of the plan.
  const time = { provide: NOW, useValue: () => new Date('2027-01-04T07:00:00Z') };
  const own = [ProgrammeStore, Planner, ProgrammePlanning, WhatIfComparison];
  TestBed.configureTestingModule({ providers: [words, server.provider, starter, time, ...own] });
  signIn(['estimator']);
  TestBed.inject(ProgrammeStore).open(read.estimateId, 0);
  await settledForSpecs();
}

/** Wanted on the day it begins, which is too soon. */
const tooSoon = programmeForSpecs({ inputs: { ...stands.inputs, direction: 'backward', day: '2027-01-04' } });

describe('As it is', () => {
  const plannedFrom = async (from_minutes: number, ways: readonly AskedWay[]) => {
    await opened(stands, () => new PlanningHereForSpecs(), from_minutes);
    const comparison = TestBed.inject(WhatIfComparison);
    await comparison.compare(stands.estimateId, stands.inputs, ways);
    return comparison.ways().map(({ readyAt }) => Date.parse(readyAt ?? ''));
  };
  const asItStands = { name: 'As it is', whatIf: asItIs };
  const kept = Date.parse(stands.startsAt) + (stands.plan?.finish_minutes ?? 0) * 60_000;

  it('never ends later than the plan that is kept, while nothing of that is past', async () => {
    expect(await plannedFrom(0, [asItStands])).toEqual([kept]);
  });

  it('begins no sooner than the other ways, where what is kept should have begun by now and was not marked', async () => {
    const asked = await plannedFrom(3 * day, [asItStands, { name: 'Again', whatIf: asItIs }]);
    const anew = programme({ ...stands.request, start_minutes: 3 * day }).finish_minutes ?? 0;
    expect(asked).toEqual([asked[1], Date.parse(stands.startsAt) + anew * 60_000]);
    expect(asked[0]).toBeGreaterThan(kept);
  });
});

describe('Help', () => {
  it('tries hands and days where all of it comes too late, and tells what does not help too', async () => {
    await opened(tooSoon);
    const planning = TestBed.inject(ProgrammePlanning);
    await planning.plan(false);
    expect(planning.findings().map(({ code }) => code)).toEqual(['programme-too-late']);
    await planning.help();
    expect(
      planning
        .remedies()
        ?.map(({ code }) => code)
        .sort(),
    ).toEqual(['programme-remedy-further-hands', 'programme-remedy-further-hands', 'programme-remedy-longer-day']);
  });

  it('is tried with the task where it was put: no hands and no size make anybody work at three in the night', async () => {
    await opened();
    const planning = TestBed.inject(ProgrammePlanning);
    expect(await planning.place('lay', day + 180)).toBe(false);
    expect(planning.findings().map(({ code }) => code)).toEqual(['programme-pin-closed']);
    await planning.help();
    const helped = planning.remedies()?.filter(({ plan }) => plan.finish_minutes !== null);
    expect([planning.remedies()?.length === 0, helped]).toEqual([false, []]);
  });

  it('can be stopped, and why there is no plan stays to be read', async () => {
    let isSilent = false;
    const silent = () => Object.assign(new EventTarget(), { terminate: () => undefined, postMessage: () => undefined });
    await opened(tooSoon, () => (isSilent ? silent() : new PlanningHereForSpecs()));
    const planning = TestBed.inject(ProgrammePlanning);
    await planning.plan(false);
    isSilent = true;
    const helping = planning.help();
    await new Promise((resolve) => setTimeout(resolve));
    await planning.stop();
    await helping;
    expect(planning.remedies()).toBeUndefined();
    expect(planning.findings()).toHaveLength(1);
  });
});
