import type { BuildUpStep } from '#shared/buildups/buildup';
import type { LotWork } from '#shared/buildups/lot-works';
import type { GildingPage } from './gilding-sheet';
import type { GildingRates } from './gilding-rates';
import { lotSteps, type NumberedStep } from './lot-steps';
import { countedUp } from './rounded';
import { formula, input, Sheet } from './sheet';
import type { TakeOff } from './take-off-sheet';
import { gradeNumber, type WorkbookFacts } from './workbook-facts';

/** Hours of set-up: worked for each lot, shared among its zones by the surface each brings. */
export interface SetUpPage {
  readonly sheet: Sheet;
  /** Set-up of one grade on one kind of work of a member, as parts of a formula. */
  readonly hoursOf: (at: { memberId: string; kind: string; gradeId: string }) => string[];
}

const at = { number: 1, piece: 2, lot: 3, step: 4, grade: 5, hours: 6, least: 7, days: 8, setUp: 9 } as const;

export interface SetUpParts {
  readonly gilding: GildingPage;
  readonly takeOff: TakeOff;
  readonly rates: GildingRates;
}

const buildUpOf = ({ prepared }: WorkbookFacts, id: string) =>
  prepared.work.zones.find(({ buildUp }) => buildUp?.id === id)?.buildUp ?? null;

const nameOf = (facts: WorkbookFacts, { name, buildUpId }: LotWork): string =>
  [name, buildUpOf(facts, buildUpId)?.name ?? buildUpId].filter(Boolean).join(': ');

/** A coat that dries a working day or longer is set up by itself. */
function leastDays(step: BuildUpStep | undefined, coats: number, facts: WorkbookFacts): number {
  const day_minutes = facts.snapshot.card.buildUps.workingDay_hours * 60;
  return step && step.drying.betweenCoats_minutes.likely >= day_minutes ? coats : 1;
}

function setUpRow(
  sheet: Sheet,
  numbered: NumberedStep,
  { facts, parts }: { facts: WorkbookFacts; parts: SetUpParts },
): string {
  const { number, lot, step } = numbered;
  const buildUp = buildUpOf(facts, lot.buildUpId);
  const piece = facts.snapshot.draft.pieces.find(({ id }) => id === lot.pieceId)?.name ?? '';
  const { rates, gilding } = parts;
  const here = (column: number) => sheet.here(column, sheet.next);
  const days = `MAX(${countedUp(`${here(at.hours)}/(${rates.workingDay}*${rates.productive}/100)`)},${here(at.least)})`;
  const row = sheet.add([
    ...[number, piece, nameOf(facts, lot), step.name, gradeNumber(facts, step.gradeId)],
    formula(gilding.hoursOfStep(number), step.hours),
    input(
      leastDays(
        buildUp?.steps.find(({ id }) => id === step.stepId),
        step.coats,
        facts,
      ),
    ),
    formula(`IF(${here(at.hours)}>0,${days},0)`, step.setUpDays),
    formula(`${here(at.days)}*${rates.setUp}`, step.setUp_hours),
  ]);
  return sheet.at(at.setUp, row);
}

function lotRow(sheet: Sheet, place: number, { facts, parts }: { facts: WorkbookFacts; parts: SetUpParts }): string {
  const lot = facts.prepared.work.lots[place];
  const zones = facts.prepared.work.zones.filter(({ zone }) => lot.zoneIds.includes(zone.id));
  const plan_m2 = zones.reduce((sum, { area }) => sum + area.plan_mm2, 0) / 1e6;
  const row = sheet.add([
    place + 1,
    null,
    nameOf(facts, lot),
    null,
    null,
    formula(parts.takeOff.lotPlan(place + 1), plan_m2),
  ]);
  return sheet.at(at.hours, row);
}

function heads({ say }: WorkbookFacts['words']): string[] {
  return [
    ...[say('sheet-head-lot-step'), say('sheet-head-piece'), say('sheet-head-buildup'), say('sheet-head-step')],
    ...[say('sheet-head-grade-number'), say('sheet-head-hours'), say('sheet-head-least-days')],
    ...[say('sheet-head-days'), say('sheet-head-set-up')],
  ];
}

/** Set-up by step and lot: as many days as the hours fill, at least one, or one for each coat that dries overnight. */
export function setUpSheet(facts: WorkbookFacts, parts: SetUpParts): SetUpPage {
  const { words, prepared } = facts;
  const figure = (format: string) => ({ width: 12, format });
  const sheet = new Sheet(words.say('sheet-set-up-page'), [
    ...[9, 24, 30, 26, 8].map((width) => ({ width, format: '' })),
    ...[figure('#,##0.0000'), figure('0'), figure('0'), figure('#,##0.0000')],
  ]);
  sheet.head(words.say('sheet-set-up-page'), words.say('sheet-set-up-note'), heads(words));
  const steps = lotSteps(facts).map((numbered) => ({
    ...numbered,
    setUp: setUpRow(sheet, numbered, { facts, parts }),
  }));
  sheet.add([]);
  sheet.add(
    [words.say('sheet-head-lot'), '', words.say('sheet-head-buildup'), '', '', words.say('sheet-head-plan')],
    'head',
  );
  const lotPlans = prepared.work.lots.map((_, place) => lotRow(sheet, place, { facts, parts }));
  const hoursOf: SetUpPage['hoursOf'] = ({ memberId, kind, gradeId }) =>
    prepared.work.lots.flatMap((lot, place) => {
      const zones = prepared.work.zones.filter((one) => one.memberId === memberId && lot.zoneIds.includes(one.zone.id));
      const own = steps.filter(
        (one) => one.lot === lot && one.kind === kind && one.step.gradeId === gradeId && one.step.setUp_hours > 0,
      );
      if (zones.length === 0 || own.length === 0) return [];
      const plans = zones.map(({ zone }) => parts.takeOff.plan.get(zone.id) ?? '0').join('+');
      return [`(${own.map(({ setUp }) => setUp).join('+')})*(${plans})/${lotPlans[place]}`];
    });
  return { sheet, hoursOf };
}
