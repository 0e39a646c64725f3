import type { SnapshotWorkshop } from '#shared/estimates/snapshot';
import type { Block, Flow } from './paper/flow';
import type { Pdf } from './paper/open-paper';
import { paperColours, textStyles } from './paper/paper-colours';
import { textLines, writeLine } from './paper/text-lines';
import type { PaperWords } from './paper-words';

const logoBox = [190, 58] as const;
const addressWidth_pt = 210;

/** The workshop as a letterhead shows it. */
export interface Letterhead {
  readonly workshop: SnapshotWorkshop;
  readonly logo: Buffer | null;
  readonly words: PaperWords;
}

function addressLines({ workshop, words }: Letterhead): string[] {
  const { addressLines: lines, telephone, email, taxRegistration } = workshop;
  return [
    ...lines,
    ...(telephone === '' ? [] : [words.say('paper-telephone', { telephone })]),
    email,
    ...(taxRegistration === '' ? [] : [words.say('paper-tax-registration', { number: taxRegistration })]),
  ].filter((line) => line.trim() !== '');
}

/** The logo where there is one that can be read, the name in its stead where there is none. */
function drawMark(flow: Flow, { workshop, logo }: Letterhead, top_pt: number): number {
  const { pdf, left } = flow;
  if (logo) {
    const bbox = [left, top_pt, left + logoBox[0], top_pt + logoBox[1]] as const;
    flow.tagged('Figure', () => pdf.image(logo, left, top_pt, { fit: [...logoBox] }), { alt: workshop.name, bbox });
    return logoBox[1];
  }
  const style = textStyles.title;
  const lines = textLines(pdf, workshop.name, { style, width_pt: flow.width - addressWidth_pt - 20 });
  flow.tagged('P', () =>
    lines.forEach((line, place) =>
      writeLine(pdf, line, { style, place: { x_pt: left, y_pt: top_pt + place * style.leading_pt } }),
    ),
  );
  return lines.length * style.leading_pt;
}

function drawAddress(flow: Flow, letterhead: Letterhead, top_pt: number): number {
  const style = textStyles.note;
  const x_pt = flow.right - addressWidth_pt;
  const named = letterhead.logo ? [letterhead.workshop.name] : [];
  const lines = [...named, ...addressLines(letterhead)].flatMap((line) =>
    textLines(flow.pdf, line, { style, width_pt: addressWidth_pt }),
  );
  if (lines.length === 0) return 0;
  flow.tagged('P', () =>
    lines.forEach((line, place) => {
      const y_pt = top_pt + place * style.leading_pt;
      const isName = place === 0 && letterhead.logo !== null;
      const own = isName ? { ...style, font: 'bold' as const, colour: paperColours.ink } : style;
      writeLine(flow.pdf, line, { style: own, place: { x_pt, y_pt } });
    }),
  );
  return lines.length * style.leading_pt;
}

/** The head of a first page: mark on the left, address on the right, one line of gold beneath. */
export const letterheadBlock = (letterhead: Letterhead): Block => ({
  lead_pt: 0,
  place: (flow) => {
    const top_pt = flow.y - 8;
    const height_pt = Math.max(drawMark(flow, letterhead, top_pt), drawAddress(flow, letterhead, top_pt));
    flow.y = top_pt + height_pt + 10;
    flow.rule(flow.y, paperColours.gold, 1.1);
    flow.y += 22;
  },
});

/** Whether a picture can be printed; one that cannot is left out, since an estimate never waits for its ornament. */
export function printableLogo(pdf: Pdf, logo: Buffer | null): Buffer | null {
  if (!logo) return null;
  try {
    (pdf as unknown as { openImage: (source: Buffer) => unknown }).openImage(logo);
    return logo;
  } catch {
    return null;
  }
}
