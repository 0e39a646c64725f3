import { inputBinding } from '@angular/core';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { programme } from '#shared/programme/programme';
import { personForSpecs } from '#shared/programme/request-for-specs';
import type { WhatIf } from '#shared/programme/what-if';
import { signIn, words } from '../../../test/sign-in';
import { NOW } from '../../core/now';
import { AnsweringForSpecs, buttonIn, spoken, type AskedParts } from '../answering-for-specs';
import { settledForSpecs } from '../settled-for-specs';
import { PLANNING_STARTER } from './planning-starter';
import { PlanningHereForSpecs } from './planning-here-for-specs';
import { programmeForSpecs } from './programme-for-specs';
import { ProgrammeStore } from './programme-store';
import { WhatIfPanel } from './what-if-panel';

const answer = programmeForSpecs();
const backward = programmeForSpecs({ inputs: { ...answer.inputs, direction: 'backward', day: '2027-01-20' } });

describe('WhatIfPanel', () => {
  let fixture: ComponentFixture<WhatIfPanel>;
  let server: AnsweringForSpecs;
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = () => settledForSpecs(fixture);

  /** When what is asked is planned from. */
  let from_minutes = 0;
  let fromOfDay_minutes = 0;
  beforeEach(() => {
    from_minutes = 0;
    fromOfDay_minutes = 0;
  });

  /** Another way costs 120 more, and whoever is there besides is really there. */
  function whatIf({ body }: AskedParts): unknown {
    const { day, furtherGradeIds, climate } = body as WhatIf;
    const further = furtherGradeIds.map((gradeId, at) => personForSpecs(`further ${at}`, gradeId));
    const isOther = furtherGradeIds.length > 0 || climate !== null;
    const { request, items, firstDay, startsAt, timeZone } = answer;
    const lags = request.lags.map((lag) => (climate && lag.fromTaskId === 'gesso' ? { ...lag, least: 2880 } : lag));
    return {
      ...{
        firstDay,
        startsAt,
        timeZone,
        items,
        findings: [],
        rates: [],
        setUp_hours: 0,
        digits: 2,
        overtime_percent: 50,
      },
      request: {
        ...request,
        start_minutes: day ? fromOfDay_minutes : from_minutes,
        lags,
        people: [...request.people, ...further],
      },
      ...{ cost_minor: isOther ? 112_000 : 100_000, costDifference_minor: isOther ? 12_000 : 0 },
      ...{ gross_minor: 150_000, grossDifference_minor: 0 },
    };
  }

  async function open(read = answer) {
    server = new AnsweringForSpecs({
      readProgramme: () => read,
      readShop: () => ({ content: { people: [] } }),
      readWhatIf: whatIf,
    });
    const time = { provide: NOW, useValue: () => new Date('2027-01-04T07:00:00Z') };
    const starter = { provide: PLANNING_STARTER, useValue: () => Promise.resolve(new PlanningHereForSpecs()) };
    TestBed.configureTestingModule({ providers: [words, server.provider, starter, time, ProgrammeStore] });
    signIn(['estimator']);
    TestBed.inject(ProgrammeStore).open(answer.estimateId, 0);
    fixture = TestBed.createComponent(WhatIfPanel, {
      bindings: [inputBinding('lots', () => []), inputBinding('buildUps', () => [])],
    });
    await settle();
  }
  function tick(place: number, isOn: boolean) {
    const box = element().querySelectorAll<HTMLInputElement>('input[type=checkbox]')[place];
    box.checked = isOn;
    box.dispatchEvent(new Event('change'));
  }
  const rows = () => [...element().querySelectorAll('tbody tr')].map((row) => [...row.children].map(spoken));

  it('has nothing to compare until a way is chosen', async () => {
    await open();
    tick(1, false);
    await settle();
    expect(buttonIn(element(), 'Compare').disabled).toBe(true);
  });

  it('proposes one more of the grade with most to do', async () => {
    await open();
    const grade = element().querySelector('select') as HTMLSelectElement;
    expect(grade.value).toBe('carver');
  });

  it('stands a colder workshop beside the programme as it is, by finish and cost', async () => {
    await open();
    tick(1, false);
    tick(2, true);
    await settle();
    buttonIn(element(), 'Compare').click();
    await settle();
    const asked = server.of('readWhatIf').map(({ body }) => (body as WhatIf).climate);
    expect(asked).toEqual([null, { temperature_celsius: 14, humidity_percent: 50 }]);
    const own = programme(answer.request).finish_minutes ?? 0;
    const [asItIs, cold] = rows();
    expect(own).toBeGreaterThan(0);
    expect([asItIs[0], asItIs[2], asItIs[3]]).toEqual(['As it is', '€1,000.00', '–']);
    expect(cold[2]).toBe('€1,120.00');
    expect(cold[3]).toMatch(/^\+\s?€120\.00$/);
    expect(cold[1]).toMatch(/days? later$/);
  });

  it('goes on from the plan as it is where the start is later, whole weeks later', async () => {
    await open();
    tick(1, false);
    tick(0, true);
    await settle();
    const asked = jest.spyOn(PlanningHereForSpecs.prototype, 'postMessage');
    fromOfDay_minutes = 8 * 1440;
    buttonIn(element(), 'Compare').click();
    await settle();
    const [, , previous, last] = asked.mock.calls.map(([{ search }]) => search);
    const own = programme(answer.request);
    expect(previous.previous?.start_minutes).toBe(own.start_minutes + 14 * 1440);
    expect(last.incumbent?.start_minutes).toBeGreaterThanOrEqual(8 * 1440);
    expect(last.incumbent?.finish_minutes).toBeLessThanOrEqual((own.finish_minutes ?? 0) + 14 * 1440);
    asked.mockRestore();
  });

  it('moves the day it is wanted by where it is planned backward, and calls it so', async () => {
    await open(backward);
    tick(1, false);
    tick(0, true);
    await settle();
    expect(spoken(element().querySelector('.choice'))).toBe('it were wanted by');
    buttonIn(element(), 'Compare').click();
    await settle();
    expect(server.of('readWhatIf').map(({ body }) => (body as WhatIf).day)).toEqual([null, '2027-01-27']);
    expect(rows()[1][0]).toMatch(/^Wanted by Wed,? 27 Jan$/);
  });

  it('says that work which should have begun is still to be done, where as it is ends later than what is kept', async () => {
    await open();
    buttonIn(element(), 'Compare').click();
    await settle();
    expect(spoken(element())).not.toContain('still to be done');
    from_minutes = 3 * 1440;
    buttonIn(element(), 'Compare').click();
    await settle();
    expect(spoken(element())).toContain('was not marked is still to be done, in each of these ways.');
  });

  it('is never later with one more pair of hands', async () => {
    await open();
    buttonIn(element(), 'Compare').click();
    await settle();
    const [, further] = rows();
    expect(further[0]).toBe('One more: Carver');
    expect(further[1]).not.toMatch(/later$/);
  });
});
