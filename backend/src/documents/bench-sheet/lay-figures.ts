import { zoneLayBands } from '#shared/documents/zone-lay-bands';
import type { ZoneFigures } from '#shared/estimates/figures';
import { layPlan, type LayPlanBand } from '#shared/leaf/lay-plan';
import { piecesAlong } from '#shared/leaf/leaf-step';
import type { CaptionedFigure } from '../paper/figure';
import { layPlanFigure } from '../paper/lay-plan-figure';
import type { Pdf } from '../paper/open-paper';
import { widthOf } from '../paper/text-block';
import type { BenchContent } from './bench-content';

/** So many leaves along are enough to see how they lie; more would be too small to see. */
const shownAlong = 11;

const coursesOf = (bands: readonly LayPlanBand[]): number =>
  bands.reduce((sum, { height_mm, pieceHeight_mm, lap_mm }) => {
    return sum + piecesAlong(height_mm, false, { side_mm: pieceHeight_mm, lap_mm });
  }, 0);

/** How a zone is laid, in words: whole leaves, strips, or cuts, with the lap. */
export function layingText({ words }: BenchContent, { leaf }: ZoneFigures): string {
  if (!leaf) return '';
  const { way, strips, cuts, lap_mm, side_mm } = leaf;
  const strip_mm = side_mm / (strips ?? 1);
  return words.say('bench-laying', { way, strips: strips ?? 1, cuts: cuts ?? 1, lap_mm, side_mm, strip_mm });
}

/** The lay plan of a zone to scale; nothing where it is laid in patches or has no leaf. */
export function layFigures(pdf: Pdf, content: BenchContent, zone: ZoneFigures): CaptionedFigure[] {
  const { words } = content;
  const member = content.members.find((one) => one.id === zone.memberId);
  const own = member?.zones.find((one) => one.id === zone.zoneId);
  if (!member || !own || !zone.leaf) return [];
  const bands = zoneLayBands({ shape: member.shape, take: own.take, leaf: zone.leaf });
  if (bands.length === 0) return [];
  const plan = layPlan(bands, shownAlong * coursesOf(bands));
  const box = { width_pt: widthOf(pdf), height_pt: 120 };
  const { figure, scale } = layPlanFigure(pdf, plan, { box, alt: words.say('bench-lay-plan', { zone: own.name }) });
  const shown = { shown_mm: plan.shownLength_mm, whole_mm: plan.length_mm };
  const note = [layingText(content, zone), ...(plan.isWhole ? [] : [words.say('bench-lay-plan-part', shown)])].join(
    ' ',
  );
  return [{ figure, caption: words.say('bench-lay-plan-scale', { zone: own.name, scale }), note }];
}
