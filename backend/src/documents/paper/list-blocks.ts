import type { Block } from './flow';
import type { Pdf } from './open-paper';
import { paperColours, textStyles } from './paper-colours';
import { textBlock } from './text-block';
import { writeLine } from './text-lines';

const indent_pt = 12;

/** One point of a list: a dash in ochre, and its text beside it. */
function listItem(pdf: Pdf, text: string): Block {
  const own = textBlock(pdf, text.replace(/\s*\n\s*/g, ' '), { indent_pt, before_pt: 2, tag: 'LBody' });
  const style = { ...textStyles.body, colour: paperColours.ochre };
  return {
    lead_pt: own.lead_pt,
    place: (flow) => {
      flow.need(own.lead_pt);
      const y_pt = flow.y + 2;
      flow.inside('LI', () => {
        flow.tagged('Lbl', () => writeLine(pdf, '–', { style, place: { x_pt: flow.left, y_pt } }));
        own.place(flow);
      });
    },
  };
}

/** Texts as a list of points. */
export function listBlock(pdf: Pdf, texts: readonly string[]): Block {
  const items = texts.map((text) => listItem(pdf, text));
  return {
    lead_pt: items[0]?.lead_pt ?? 0,
    place: (flow) => flow.inside('L', () => items.forEach((item) => item.place(flow))),
  };
}
