import { stepWorkKind } from '#shared/estimates/step-work-kind';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import type { StepHours } from '#shared/buildups/step-hours';
import type { GildingRates } from './gilding-rates';
import { handsOnFormula } from './hands-on-formula';
import type { LeafPages } from './leaf-pages';
import { lotSteps, type NumberedStep } from './lot-steps';
import { formula, input, Sheet, type CellContent } from './sheet';
import type { TakeOff } from './take-off-sheet';
import { gradeNumber, lineNumber, type WorkbookFacts } from './workbook-facts';

/** The hands-on hours of ground, gilding and finishing, zone by zone and step by step. */
export interface GildingPage {
  readonly sheet: Sheet;
  /** Hours of one grade on one line, and of one step of a lot, as formulas. */
  readonly hoursOnLine: (line: number, grade: number) => string;
  readonly hoursOfStep: (step: number) => string;
  readonly hasHours: (line: number, grade: number) => boolean;
}

const at = { line: 1, member: 2, zone: 3, step: 4, grade: 5, gradeName: 6, lotStep: 7, coats: 8, hours: 9 } as const;

export interface GildingParts {
  readonly takeOff: TakeOff;
  readonly leaf: LeafPages;
  readonly rates: GildingRates;
}

function heads({ say }: WorkbookFacts['words']): string[] {
  return [
    ...[say('sheet-head-line'), say('sheet-head-member'), say('sheet-head-zone'), say('sheet-head-step')],
    ...[say('sheet-head-grade-number'), say('sheet-head-grade'), say('sheet-head-lot-step'), say('sheet-head-coats')],
    say('sheet-head-hours'),
  ];
}

interface StepRow {
  readonly zone: WorkedZone;
  readonly worked: StepHours;
  readonly lotStep: number;
}

function stepRow(
  sheet: Sheet,
  { zone, worked, lotStep }: StepRow,
  { facts, parts }: { facts: WorkbookFacts; parts: GildingParts },
) {
  const { buildUp } = zone;
  const step = buildUp?.steps.find(({ id }) => id === worked.stepId);
  if (!buildUp || !step) return;
  const coats = sheet.here(at.coats, sheet.next);
  const text = handsOnFormula(step, { ...parts, zone, buildUp, coats });
  if (text === null) return;
  const { members } = facts.prepared.work;
  const grade = facts.grades.find(({ id }) => id === worked.gradeId)?.name ?? worked.gradeId;
  sheet.add([
    lineNumber(facts, { memberId: zone.memberId, kind: stepWorkKind[worked.kind] }),
    members.find(({ member }) => member.id === zone.memberId)?.member.name ?? '',
    ...[zone.zone.name, worked.name, gradeNumber(facts, worked.gradeId), grade, lotStep],
    step.work.way === 'area' ? input(worked.coats) : null,
    formula(text, worked.hours.likely),
  ]);
}

const numberOfStep = (steps: readonly NumberedStep[], zone: WorkedZone, stepId: string): number =>
  steps.find(({ lot, step }) => step.stepId === stepId && lot.zoneIds.includes(zone.zone.id))?.number ?? 0;

/** Which grades have hours on which lines. */
function workedPairs(sheet: Sheet, from: number): GildingPage['hasHours'] {
  const pairs = new Map<CellContent, Set<CellContent>>();
  for (const { cells } of sheet.rows.slice(from - 1)) {
    const grades = pairs.get(cells[at.line - 1]) ?? new Set();
    pairs.set(cells[at.line - 1], grades.add(cells[at.grade - 1]));
  }
  return (line, grade) => pairs.get(line)?.has(grade) ?? false;
}

/** Hours by step: areas, leaves and coats times what the rates say. */
export function gildingSheet(facts: WorkbookFacts, parts: GildingParts): GildingPage {
  const { words, prepared } = facts;
  const widths = [7, 30, 24, 26, 7, 18, 9];
  const sheet = new Sheet(words.say('sheet-gilding'), [
    ...widths.map((width) => ({ width, format: '' })),
    ...[
      { width: 8, format: '0' },
      { width: 13, format: '#,##0.0000' },
    ],
  ]);
  sheet.head(words.say('sheet-gilding'), words.say('sheet-gilding-note'), heads(words));
  const from = sheet.next;
  const steps = lotSteps(facts);
  for (const zone of prepared.work.zones) {
    for (const worked of zone.handsOn.steps)
      stepRow(sheet, { zone, worked, lotStep: numberOfStep(steps, zone, worked.stepId) }, { facts, parts });
  }
  const to = Math.max(from, sheet.rows.length);
  const span = (column: number) => sheet.span(column, from, to);
  return {
    sheet,
    hoursOnLine: (line, grade) => `SUMIFS(${span(at.hours)},${span(at.line)},${line},${span(at.grade)},${grade})`,
    hoursOfStep: (step) => `SUMIFS(${span(at.hours)},${span(at.lotStep)},${step})`,
    hasHours: workedPairs(sheet, from),
  };
}
