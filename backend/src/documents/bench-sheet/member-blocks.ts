import type { UseFigures, ZoneFigures } from '#shared/estimates/figures';
import type { Member } from '#shared/estimates/member';
import { flatBox } from '#shared/measure/drawing/face-openings';
import type { Opening } from '#shared/measure/opening';
import { drawnMembers } from '../drawn-members';
import { figureRows, figureWidth } from '../paper/figure-rows';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { partBlocks, sectionBlocks } from '../paper/section-blocks';
import { tableBlock, type TableRow } from '../paper/table-block';
import { textBlock } from '../paper/text-block';
import type { BenchContent } from './bench-content';
import { layFigures, layingText } from './lay-figures';

function memberFacts({ request, words }: BenchContent, member: Member): string {
  const figures = request.figures.members.find((one) => one.memberId === member.id);
  if (!figures) return '';
  const { timber, developed_mm2, girth_mm, run_mm, carving_hours } = figures;
  return [
    words.say('bench-count', { count: member.count }),
    timber,
    words.say('bench-surface', { developed_mm2 }),
    ...(girth_mm === null ? [] : [words.say('bench-girth', { girth_mm })]),
    ...(run_mm === null ? [] : [words.say('bench-run', { run_mm })]),
    ...(carving_hours.likely > 0 ? [words.say('bench-carving', { carving_hours: carving_hours.likely })] : []),
  ].join(' · ');
}

function openingText({ words }: BenchContent, { shape, count }: Opening): string {
  const isMeasured = shape.kind === 'measured';
  const box = isMeasured ? { width_mm: 0, height_mm: 0 } : flatBox(shape);
  return words.say('bench-opening', {
    count,
    shape: shape.kind,
    length_mm: box.width_mm,
    height_mm: shape.kind === 'ring' ? shape.innerDiameter_mm : box.height_mm,
    area_mm2: isMeasured ? shape.area_mm2 : 0,
  });
}

function openingsText(content: BenchContent, { openings }: Member): string {
  if (openings.length === 0) return '';
  const texts = openings.map((opening) => openingText(content, opening));
  return content.words.say('bench-openings', { openings: texts.join(', ') });
}

function useRow({ words }: BenchContent, use: UseFigures): TableRow {
  const { fit } = use;
  const isFitted = fit !== null && fit.repeats > 0;
  return {
    cells: [
      { text: use.ornament, style: textStyles.medium, isRowHead: true },
      { text: words.figure('number', use.quantity) },
      { text: isFitted ? words.say('bench-repeats', { repeats: fit.repeats, halves: fit.halves }) : '' },
      { text: isFitted ? words.length(fit.pitch_mm) : '' },
      { text: isFitted ? words.figure('percent', fit.stretch * 100) : '' },
    ],
    above: 'hair',
  };
}

function ornamentTable(pdf: Pdf, content: BenchContent, member: Member): Block[] {
  const uses = content.uses.filter((use) => use.memberId === member.id);
  if (uses.length === 0) return [];
  const { say } = content.words;
  const figures = (head: string) => ({ head, width: 'fit', align: 'right' }) as const;
  const columns = [
    { head: say('bench-column-ornament'), width: 'rest' } as const,
    figures(say('bench-column-amount')),
    figures(say('bench-column-repeats')),
    figures(say('bench-column-pitch')),
    figures(say('bench-column-stretch')),
  ];
  return [
    tableBlock(
      pdf,
      columns,
      uses.map((use) => useRow(content, use)),
    ),
  ];
}

function zoneRow(content: BenchContent, member: Member, zone: ZoneFigures): TableRow {
  const { words } = content;
  const name = member.zones.find((one) => one.id === zone.zoneId)?.name ?? '';
  const ground = zone.ground_mm > 0 ? words.say('bench-ground', { ground_mm: zone.ground_mm }) : '';
  const leaf = zone.leaf ? [zone.leaf.name, layingText(content, zone)].join(': ') : '';
  return {
    cells: [
      { text: name, style: textStyles.medium, isRowHead: true },
      { text: zone.buildUp, note: [ground, leaf].filter(Boolean).join(' ') },
      { text: words.figure('mm2', zone.true_mm2) },
      { text: zone.leaf ? words.figure('number', Math.round(zone.leaf.grossLeaves.likely * 10) / 10) : '' },
    ],
    above: 'hair',
  };
}

function zoneTable(pdf: Pdf, content: BenchContent, member: Member): Block[] {
  const zones = content.zones.filter((zone) => zone.memberId === member.id);
  if (zones.length === 0) return [];
  const { say } = content.words;
  const columns = [
    { head: say('bench-column-zone'), width: 90 },
    { head: say('bench-column-buildup'), width: 'rest' },
    { head: say('bench-column-true-surface'), width: 'fit', align: 'right' },
    { head: say('bench-column-leaves'), width: 'fit', align: 'right' },
  ] as const;
  return [
    tableBlock(
      pdf,
      columns,
      zones.map((zone) => zoneRow(content, member, zone)),
    ),
  ];
}

function memberParts(pdf: Pdf, content: BenchContent, member: Member): Block[] {
  const { words } = content;
  const setting = { box: { width_pt: figureWidth(pdf, 2), height_pt: 190 }, words, isForTheBench: true };
  const drawings = drawnMembers(pdf, [member], setting).map((figure) => ({ ...figure, caption: '' }));
  const plans = content.zones
    .filter((zone) => zone.memberId === member.id)
    .flatMap((zone) => layFigures(pdf, content, zone));
  const rows = figureRows(pdf, drawings, 2);
  const facts = textBlock(pdf, memberFacts(content, member), { style: textStyles.note });
  const parts = [
    { ...facts, lead_pt: facts.lead_pt + (rows[0]?.lead_pt ?? 0) },
    ...[openingsText(content, member), member.note]
      .filter((text) => text.trim() !== '')
      .map((text) => textBlock(pdf, text, { before_pt: 3 })),
    ...rows,
    ...ornamentTable(pdf, content, member),
    ...zoneTable(pdf, content, member),
    ...figureRows(pdf, plans, 1),
  ];
  return partBlocks(pdf, member.name, parts);
}

/** Every member of the piece: drawings with all dimensions, ornament with its fitted pitch, zones with leaf and how it is laid. */
export const memberBlocks = (pdf: Pdf, content: BenchContent): Block[] =>
  sectionBlocks(
    pdf,
    content.words.say('bench-members'),
    content.members.flatMap((member) => memberParts(pdf, content, member)),
  );
