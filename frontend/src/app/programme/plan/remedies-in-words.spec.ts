import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { WordCode } from '#shared/words/word-code';
import { signIn, words } from '../../../test/sign-in';
import { AnsweringForSpecs } from '../answering-for-specs';
import { settledForSpecs } from '../settled-for-specs';
import { PlanWords } from './plan-words';
import { programmeForSpecs } from './programme-for-specs';
import { ProgrammePlanning } from './programme-planning';
import { ProgrammeStore } from './programme-store';
import type { CostedRemedy } from './remedy-costs';
import { TaskWords } from './task-words';

const stands = programmeForSpecs();
const plan = stands.plan as NonNullable<typeof stands.plan>;

interface Told {
  readonly code?: WordCode;
  readonly finish_minutes?: number | null;
  readonly cost_minor: number | null;
  readonly overtime_percent?: number;
}

/** A longer day by an hour unless another way is told, ready on Tuesday, 5 January at three in the afternoon. */
function remedy({
  code = 'programme-remedy-longer-day',
  finish_minutes = 1440 + 900,
  cost_minor,
  overtime_percent = 50,
}: Told): CostedRemedy {
  const values = { by_minutes: 60, portions: 2, task: 'Lay', grade: 'gilder', size: 'Slow size' };
  return { code, values, request: stands.request, plan: { ...plan, finish_minutes }, cost_minor, overtime_percent };
}

async function sentences(remedies: readonly CostedRemedy[]): Promise<readonly string[]> {
  const server = new AnsweringForSpecs({
    readProgramme: () => stands,
    readShop: () => ({ content: { people: [] } }),
  });
  const planning = { remedies: signal(remedies), bestFinish_minutes: signal(undefined), isOnServer: signal(false) };
  const own = [ProgrammeStore, TaskWords, PlanWords, { provide: ProgrammePlanning, useValue: planning }];
  TestBed.configureTestingModule({ providers: [words, server.provider, ...own] });
  signIn(['estimator']);
  TestBed.inject(ProgrammeStore).open(stands.estimateId, 0);
  await settledForSpecs();
  return TestBed.inject(PlanWords).helps();
}

describe('What helps, in words', () => {
  it.each<[string, Told, RegExp]>([
    [
      'overtime with its premium',
      { cost_minor: 4950 },
      /Ready on .+15:00.+ It costs the workshop €49\.50 more, with 50.?% on top for overtime\.$/,
    ],
    [
      'the premium the workshop has',
      { cost_minor: 990, overtime_percent: 10 },
      /more, with 10.?% on top for overtime\.$/,
    ],
    ['no cost', { cost_minor: 0 }, /It costs the workshop no more\.$/],
    [
      'less',
      { code: 'programme-remedy-other-size', cost_minor: -1200 },
      /^With Slow size instead\. .+ It costs the workshop €12\.00 less\.$/,
    ],
    [
      'no overtime in portions',
      { code: 'programme-remedy-portions', cost_minor: 1650 },
      /It costs the workshop €16\.50 more\.$/,
    ],
    ['nothing to those who see no cost', { cost_minor: null }, /Ready on [^.]+15:00\.$/],
    ['what does not help', { finish_minutes: null, cost_minor: null }, /This does not help\.$/],
  ])('tells %s', async (_, told, expected) => {
    const [sentence] = await sentences([remedy(told)]);
    expect(sentence.replaceAll(/[\u00a0\u202f]/g, ' ')).toMatch(expected);
  });
});
