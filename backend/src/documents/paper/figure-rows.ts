import type { CaptionedFigure } from './figure';
import type { Block, Flow } from './flow';
import type { Pdf } from './open-paper';
import { textStyles } from './paper-colours';
import { widthOf } from './text-block';
import { textLines, writeLine } from './text-lines';

const gap_pt = 18;

/** The width one figure may take where so many stand side by side, in points. */
export const figureWidth = (pdf: Pdf, columns: number): number => (widthOf(pdf) - gap_pt * (columns - 1)) / columns;

interface Laid extends CaptionedFigure {
  readonly lines: readonly { readonly text: string; readonly style: (typeof textStyles)['medium' | 'note'] }[];
  readonly caption_pt: number;
}

function laidFigure(pdf: Pdf, captioned: CaptionedFigure, width_pt: number): Laid {
  const set = (text: string, style: Laid['lines'][number]['style']) =>
    text === '' ? [] : textLines(pdf, text, { style, width_pt }).map((line) => ({ text: line, style }));
  const lines = [...set(captioned.caption, textStyles.medium), ...set(captioned.note, textStyles.note)];
  return { ...captioned, lines, caption_pt: lines.reduce((sum, { style }) => sum + style.leading_pt, 0) };
}

function drawFigure(flow: Flow, { figure, lines }: Laid, at: { x_pt: number; base_pt: number }): void {
  const { pdf } = flow;
  const y_pt = at.base_pt - figure.height_pt;
  const bbox = [at.x_pt, y_pt, at.x_pt + figure.width_pt, at.base_pt] as const;
  flow.tagged('Figure', () => figure.draw(at.x_pt, y_pt), { alt: figure.alt, bbox });
  flow.tagged('Caption', () => {
    let line_pt = at.base_pt + 3;
    for (const { text, style } of lines) {
      writeLine(pdf, text, { style, place: { x_pt: at.x_pt, y_pt: line_pt } });
      line_pt += style.leading_pt;
    }
  });
}

function rowBlock(row: readonly Laid[], width_pt: number): Block {
  const figures_pt = Math.max(...row.map(({ figure }) => figure.height_pt));
  const height_pt = 10 + figures_pt + 3 + Math.max(...row.map(({ caption_pt }) => caption_pt));
  return {
    lead_pt: height_pt,
    place: (flow) => {
      const base_pt = flow.y + 10 + figures_pt;
      row.forEach((laid, place) =>
        flow.inside('Div', () => drawFigure(flow, laid, { x_pt: flow.left + place * (width_pt + gap_pt), base_pt })),
      );
      flow.y += height_pt;
    },
  };
}

/** Figures side by side, standing on one line, captions beneath; a row is never parted. */
export function figureRows(pdf: Pdf, figures: readonly CaptionedFigure[], columns: number): Block[] {
  const width_pt = figureWidth(pdf, columns);
  const laid = figures.map((figure) => laidFigure(pdf, figure, width_pt));
  const rows = Array.from({ length: Math.ceil(laid.length / columns) }, (_, row) =>
    laid.slice(row * columns, (row + 1) * columns),
  );
  return rows.map((row) => rowBlock(row, width_pt));
}
