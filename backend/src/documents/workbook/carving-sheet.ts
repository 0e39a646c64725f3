import type { UseHours } from '#shared/carving/carving-result';
import type { RecuttingManner } from '#shared/carving/carving-card';
import type { CarvingRates } from './carving-rates';
import { formula, input, Sheet, type CellContent } from './sheet';
import type { TakeOff } from './take-off-sheet';
import { gradeNumber, lineNumber, type WorkbookFacts } from './workbook-facts';

/** The carving hours, ornament by ornament. */
export interface CarvingPage {
  readonly sheet: Sheet;
  /** Carving hours of one grade on one line, as parts of a formula. */
  readonly hoursOf: (line: number, gradeId: string) => string[];
}

const at = {
  line: 1,
  member: 2,
  what: 3,
  amount: 4,
  hours: 5,
  stages: 6,
  undercut: 7,
  grade: 8,
  cut: 9,
  once: 10,
  recut: 11,
} as const;

export interface CarvingParts {
  readonly takeOff: TakeOff;
  readonly rates: CarvingRates;
}

interface Page extends CarvingParts {
  readonly sheet: Sheet;
  readonly facts: WorkbookFacts;
}

const likelyOf = (use: UseHours, kinds: readonly string[]): number =>
  use.rows.filter((row) => kinds.includes(row.kind)).reduce((sum, row) => sum + row.hours.likely, 0);

const mannerOf = ({ facts }: Page, zoneId: string | null): RecuttingManner | null =>
  facts.prepared.work.zones.find(({ zone }) => zone.id === zoneId)?.zone.recutting ?? null;

/** Recutting comes with the carving of a zone that is recut: a share of what is repeated or carved freely. */
function recutCell(page: Page, use: UseHours, isFree: boolean): CellContent {
  const manner = mannerOf(page, use.zoneId);
  if (!manner) return null;
  const { sheet, rates, facts } = page;
  const here = (column: number) => sheet.here(column, sheet.next);
  const carved = isFree ? here(at.cut) : `(${here(at.stages)}+${here(at.undercut)})`;
  const share = facts.snapshot.card.carving.recutting[manner].share_percent / 100;
  return formula(`${carved}*${rates.recutShare[manner]}/100`, likelyOf(use, ['stage', 'undercutting', 'free']) * share);
}

function ornamentCells(page: Page, use: UseHours): CellContent[] {
  const { sheet, rates } = page;
  const here = (column: number) => sheet.here(column, sheet.next);
  const undercut = likelyOf(use, ['undercutting']);
  const isUndercut = use.rows.some(({ kind }) => kind === 'undercutting');
  const hours = here(at.hours);
  return [
    input(use.carving.likely),
    formula(isUndercut ? `${hours}/(1+${rates.undercut}/100)` : hours, likelyOf(use, ['stage'])),
    isUndercut ? formula(`${hours}-${here(at.stages)}`, undercut) : null,
    ...[null, null, null],
    recutCell(page, use, false),
  ];
}

/** An item of the card goes to one grade: cut in wood, or done once. */
function itemCells(page: Page, use: UseHours): CellContent[] {
  const [row] = use.rows;
  const grade = gradeNumber(page.facts, row?.gradeId ?? '');
  const isOnce = row?.kind === 'once';
  const figure = input(use.carving.likely);
  const recut = row?.kind === 'free' ? recutCell(page, use, true) : null;
  return [null, null, null, grade, isOnce ? null : figure, isOnce ? figure : null, recut];
}

function useRow(page: Page, use: UseHours): void {
  const { facts, sheet } = page;
  const { ornaments, items } = facts.snapshot.card.carving;
  const member = facts.prepared.work.members.find((one) =>
    one.member.ornaments.some(({ id }) => id === use.useId),
  )?.member;
  const name = [...ornaments, ...items].find(({ id }) => id === use.ornamentId)?.name ?? use.ornamentId;
  const isOrnament = ornaments.some(({ id }) => id === use.ornamentId);
  const line = lineNumber(facts, { memberId: member?.id ?? null, kind: 'carving' });
  const cells = isOrnament ? ornamentCells(page, use) : itemCells(page, use);
  sheet.add([line, member?.name ?? '', name, use.quantity, ...cells]);
}

/** Drawing and pattern stand where the ornament is used first. */
function patternRows({ facts, sheet }: Page): void {
  const { carving, members } = facts.prepared.work;
  const { ornaments, patternGradeId } = facts.snapshot.card.carving;
  for (const { ornamentId, patterns, hours } of carving.patterns) {
    const first = carving.uses.find((use) => use.ornamentId === ornamentId);
    const member = members.find((one) => one.member.ornaments.some(({ id }) => id === first?.useId))?.member;
    const ornament = ornaments.find(({ id }) => id === ornamentId)?.name ?? ornamentId;
    const line = lineNumber(facts, { memberId: member?.id ?? null, kind: 'carving' });
    const name = facts.words.say('sheet-pattern', { ornament });
    const grade = gradeNumber(facts, patternGradeId);
    sheet.add([line, member?.name ?? '', name, patterns, null, null, null, grade, null, input(hours.likely)]);
  }
}

/** Zones recut although nothing is carved on them in this estimate go by their plan area. */
function bareRows({ facts, sheet, takeOff, rates }: Page): void {
  const { carving, zones, members } = facts.prepared.work;
  const isCarved = (use: UseHours) => likelyOf(use, ['stage', 'undercutting', 'free']) > 0;
  const carved = new Set(carving.uses.filter(isCarved).map((use) => use.zoneId));
  for (const recut of carving.recut.filter(({ zoneId }) => !carved.has(zoneId))) {
    const zone = zones.find((one) => one.zone.id === recut.zoneId);
    const manner = zone?.zone.recutting;
    if (!zone || !manner) continue;
    const member = members.find((one) => one.member.id === zone.memberId)?.member;
    const line = lineNumber(facts, { memberId: zone.memberId, kind: 'carving' });
    const name = facts.words.say('sheet-recut-zone', { zone: zone.zone.name });
    const text = `${takeOff.plan.get(recut.zoneId)}*${rates.recutHours[manner]}`;
    const cells = [null, null, null, null, null, null, null, formula(text, recut.hours.likely)];
    sheet.add([line, member?.name ?? '', name, ...cells]);
  }
}

function heads({ say }: WorkbookFacts['words']): string[] {
  return [
    ...[say('sheet-head-line'), say('sheet-head-member'), say('sheet-head-ornament'), say('sheet-head-amount')],
    ...[say('sheet-head-ornament-hours'), say('sheet-head-by-stages'), say('sheet-head-undercutting')],
    ...[say('sheet-head-grade-number'), say('sheet-head-cut'), say('sheet-head-once'), say('sheet-head-recutting')],
  ];
}

function hoursOfLine(page: Page, span: (column: number) => string): CarvingPage['hoursOf'] {
  const { facts, rates } = page;
  const { carving } = facts.snapshot.card;
  const { rows } = page.sheet;
  const has = (line: number, column: number, grade: number | null) =>
    rows.some(
      ({ cells }) => cells[0] === line && cells[column - 1] && (grade === null || cells[at.grade - 1] === grade),
    );
  const sum = (line: number, column: number, grade: number | null) =>
    `SUMIFS(${span(column)},${span(at.line)},${line}${grade === null ? '' : `,${span(at.grade)},${grade}`})`;
  return (line, gradeId) => {
    const grade = gradeNumber(facts, gradeId);
    const stages = rates.stages(gradeId);
    const cut = [
      ...(stages && has(line, at.stages, null) ? [`${sum(line, at.stages, null)}*${stages}`] : []),
      ...(gradeId === carving.undercuttingGradeId && has(line, at.undercut, null)
        ? [sum(line, at.undercut, null)]
        : []),
      ...(has(line, at.cut, grade) ? [sum(line, at.cut, grade)] : []),
    ];
    return [
      ...(cut.length > 0 ? [`(${cut.join('+')})*(1+${rates.sharpening}/100)`] : []),
      ...(has(line, at.once, grade) ? [sum(line, at.once, grade)] : []),
      ...(gradeId === carving.recutting.gradeId && has(line, at.recut, null) ? [sum(line, at.recut, null)] : []),
    ];
  };
}

/** Carving: hours of each ornament as they were worked, divided by grade with the shares of the card. */
export function carvingSheet(facts: WorkbookFacts, parts: CarvingParts): CarvingPage {
  const { words, prepared } = facts;
  const figure = { width: 13, format: '#,##0.0000' };
  const sheet = new Sheet(words.say('sheet-carving'), [
    ...[7, 30, 30].map((width) => ({ width, format: '' })),
    ...[{ width: 10, format: '0.####' }, figure, figure, figure, { width: 8, format: '' }, figure, figure, figure],
  ]);
  sheet.head(words.say('sheet-carving'), words.say('sheet-carving-note'), heads(words));
  const from = sheet.next;
  const page = { ...parts, sheet, facts };
  for (const use of prepared.work.carving.uses) useRow(page, use);
  patternRows(page);
  bareRows(page);
  const to = Math.max(from, sheet.rows.length);
  return { sheet, hoursOf: hoursOfLine(page, (column) => sheet.span(column, from, to)) };
}
