import type { DryLot } from '#shared/estimates/dry-figures';
import type { SequenceStep } from '#shared/drying/sequence-step';
import { drawnStrip } from '../drawn-strips';
import { figureRows, figureWidth } from '../paper/figure-rows';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { textBlock } from '../paper/text-block';
import { partBlocks, sectionBlocks } from '../paper/section-blocks';
import { tableBlock, type TableRow } from '../paper/table-block';
import type { BenchContent, BenchLot } from './bench-content';

/** The fewest and most coats any zone of the lot gets of a step. */
function coatsText({ words }: BenchContent, { zones }: BenchLot, step: SequenceStep): string {
  const coats = zones.flatMap((zone) =>
    zone.steps.filter(({ stepId }) => stepId === step.stepId).map((one) => one.coats),
  );
  const [fewest, most] = [Math.min(...coats), Math.max(...coats)];
  if (coats.length === 0) return String(step.coats);
  return fewest === most ? String(most) : words.say('paper-coats', { fewest, most });
}

function windowText(step: SequenceStep, { words: { say } }: BenchContent): string {
  const { opens_minutes, closes_minutes } = step;
  if (closes_minutes !== null) {
    return say(step.endsInWindow ? 'bench-window-done' : 'bench-window', { opens_minutes, closes_minutes });
  }
  return opens_minutes > 0 ? say('bench-after', { opens_minutes }) : '';
}

/** Rules that hold besides: between coats, the whole of a step, another step by a time, what is waited for. */
function ruleTexts(step: SequenceStep, lot: DryLot, { words: { say } }: BenchContent): string[] {
  const {
    coats,
    betweenCoats_minutes: between_minutes,
    latestCoat_minutes: latest_minutes,
    wholeWithin_minutes,
  } = step;
  const isSeveral = coats > 1 && between_minutes > 0;
  return [
    ...(isSeveral && latest_minutes === null ? [say('bench-between', { between_minutes })] : []),
    ...(isSeveral && latest_minutes !== null ? [say('bench-between-latest', { between_minutes, latest_minutes })] : []),
    ...(wholeWithin_minutes === null ? [] : [say('bench-whole-within', { within_minutes: wholeWithin_minutes })]),
    ...step.lags.flatMap(({ toStepId, finishedWithin_minutes: within_minutes, least_minutes }) => {
      const name = lot.steps.find((one) => one.stepId === toStepId)?.name;
      if (!name) return [];
      return [
        ...(within_minutes === null ? [] : [say('bench-finished-within', { step: name, within_minutes })]),
        ...(least_minutes === null ? [] : [say('bench-not-before', { step: name, least_minutes })]),
      ];
    }),
    ...step.holds.map((hold) => say(`bench-hold-${hold}`)),
  ];
}

function stepRow(step: SequenceStep, own: BenchLot, content: BenchContent): TableRow {
  const { words } = content;
  return {
    cells: [
      { text: step.name, note: ruleTexts(step, own.lot, content).join(' '), style: textStyles.medium, isRowHead: true },
      { text: coatsText(content, own, step) },
      { text: step.handsOn_minutes === 0 ? '' : words.figure('hours', step.handsOn_minutes / 60) },
      { text: windowText(step, content) },
    ],
    above: 'hair',
  };
}

function stepsTable(pdf: Pdf, own: BenchLot, content: BenchContent): Block {
  const { say } = content.words;
  const columns = [
    { head: say('bench-column-step'), width: 'rest' },
    { head: say('bench-column-coats'), width: 'fit', align: 'right' },
    { head: say('bench-column-hands-on'), width: 'fit', align: 'right' },
    { head: say('bench-column-next'), width: 150 },
  ] as const;
  // A step that takes no time and lets nothing wait is not done here.
  const done = own.lot.steps.filter((step) => step.handsOn_minutes > 0 || step.opens_minutes > 0);
  const rows = done.map((step) => stepRow(step, own, content));
  return tableBlock(pdf, columns, rows);
}

function lotParts(pdf: Pdf, content: BenchContent, own: BenchLot): Block[] {
  const { lot, used, name, members } = own;
  const width_pt = figureWidth(pdf, 2);
  const strip = used
    ? [{ figure: drawnStrip(pdf, used, { words: content.words, width_pt }), caption: '', note: '' }]
    : [];
  const together = textBlock(pdf, members.map((member) => member.name).join(', '), { style: textStyles.note });
  const steps = lot.steps.length > 0 ? [stepsTable(pdf, own, content)] : [];
  const parts = [...figureRows(pdf, strip, 2), together, ...steps];
  return partBlocks(pdf, [name, lot.buildUp].filter(Boolean).join(': '), parts);
}

/** What is coated together: the section of each build-up, its steps with coats, hands-on hours and windows in the shop's air. */
export function lotBlocks(pdf: Pdf, content: BenchContent): Block[] {
  const { words, lots } = content;
  return sectionBlocks(
    pdf,
    words.say('bench-buildups'),
    lots.flatMap((lot) => lotParts(pdf, content, lot)),
  );
}
