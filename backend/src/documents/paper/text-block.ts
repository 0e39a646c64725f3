import type { Block, Flow } from './flow';
import type { Pdf } from './open-paper';
import { textStyles, type TextStyle } from './paper-colours';
import { textLines, writeLine } from './text-lines';

/** How a text is set on the width of a page, in points. */
export interface TextSetting {
  readonly style?: TextStyle;
  readonly before_pt?: number;
  readonly tag?: string;
  /** Indent from the left, and what is left free on the right. */
  readonly indent_pt?: number;
  readonly free_pt?: number;
}

/** A paragraph never leaves one line alone at the foot or the head of a page. */
const together = 2;

function placeLines(flow: Flow, lines: readonly string[], at: { style: TextStyle; x_pt: number }): void {
  const { style, x_pt } = at;
  lines.forEach((line, place) => {
    const left = lines.length - place;
    const isPair = place > 0 && left === together;
    flow.need(isPair ? together * style.leading_pt : style.leading_pt);
    const y_pt = flow.y;
    flow.draw(() => writeLine(flow.pdf, line, { style, place: { x_pt, y_pt } }));
    flow.y += style.leading_pt;
  });
}

/** One paragraph, or several under one tag each where the text has line ends. */
export function textBlock(pdf: Pdf, text: string, setting: TextSetting = {}): Block {
  const { style = textStyles.body, before_pt = 0, tag = 'P', indent_pt = 0, free_pt = 0 } = setting;
  const width_pt = widthOf(pdf) - indent_pt - free_pt;
  const paragraphs = text.split(/\r?\n/).filter((line) => line.trim() !== '');
  const broken = paragraphs.map((paragraph) => textLines(pdf, paragraph, { style, width_pt }));
  const first = Math.min(together, broken[0]?.length ?? 0);
  return {
    lead_pt: before_pt + first * style.leading_pt,
    place: (flow) => {
      flow.space(before_pt);
      broken.forEach((lines, place) => {
        if (place > 0) flow.space(style.leading_pt * 0.3);
        flow.need(Math.min(together, lines.length) * style.leading_pt);
        flow.inside(tag, () => placeLines(flow, lines, { style, x_pt: flow.left + indent_pt }));
      });
    },
  };
}

/** Width between the margins of the paper's pages, in points. */
export const widthOf = (pdf: Pdf): number => {
  const size = pdf.options.size === 'LETTER' ? 612 : 595.28;
  const { left, right } = pdf.options.margins as { left: number; right: number };
  return size - left - right;
};
