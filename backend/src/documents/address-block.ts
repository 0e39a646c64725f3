import type { Block, Flow } from './paper/flow';
import type { Pdf } from './paper/open-paper';
import { textStyles } from './paper/paper-colours';
import { widthOf } from './paper/text-block';
import { textLines, writeLine } from './paper/text-lines';

/** Who a paper is for, and what it is about in a few particulars. */
export interface AddressFacts {
  readonly address: readonly string[];
  readonly particulars: readonly (readonly [string, string])[];
}

const particularsWidth_pt = 210;
const labelWidth_pt = 78;

interface Line {
  readonly label: string;
  readonly text: string;
}

function particularLines(pdf: Pdf, particulars: AddressFacts['particulars']): Line[] {
  const width_pt = particularsWidth_pt - labelWidth_pt;
  return particulars
    .filter(([, text]) => text.trim() !== '')
    .flatMap(([label, text]) =>
      textLines(pdf, text, { style: textStyles.body, width_pt }).map((line, place) => ({
        label: place === 0 ? label : '',
        text: line,
      })),
    );
}

function drawAddress(flow: Flow, lines: readonly string[], top_pt: number): void {
  const style = textStyles.body;
  if (lines.length === 0) return;
  flow.tagged('P', () =>
    lines.forEach((line, place) => {
      const at = { x_pt: flow.left, y_pt: top_pt + place * style.leading_pt };
      writeLine(flow.pdf, line, { style: place === 0 ? textStyles.strong : style, place: at });
    }),
  );
}

function drawParticulars(flow: Flow, lines: readonly Line[], top_pt: number): void {
  const x_pt = flow.right - particularsWidth_pt;
  const { leading_pt } = textStyles.body;
  lines.forEach(({ label, text }, place) => {
    const y_pt = top_pt + place * leading_pt;
    flow.tagged('P', () => {
      const style = { ...textStyles.note, leading_pt };
      writeLine(flow.pdf, label, { style, place: { x_pt, y_pt } });
      writeLine(flow.pdf, text, { style: textStyles.body, place: { x_pt: x_pt + labelWidth_pt, y_pt } });
    });
  });
}

/** The address on the left and the particulars on the right, on one height. */
export function addressBlock(pdf: Pdf, { address, particulars }: AddressFacts): Block {
  const width_pt = widthOf(pdf) - particularsWidth_pt - 20;
  const left = address
    .flatMap((line) => line.split(/\r?\n/))
    .filter((line) => line.trim() !== '')
    .flatMap((line) => textLines(pdf, line, { style: textStyles.body, width_pt }));
  const right = particularLines(pdf, particulars);
  const height_pt = Math.max(left.length, right.length) * textStyles.body.leading_pt;
  return {
    lead_pt: height_pt,
    place: (flow) => {
      const top_pt = flow.y;
      drawAddress(flow, left, top_pt);
      drawParticulars(flow, right, top_pt);
      flow.y = top_pt + height_pt + 24;
    },
  };
}
