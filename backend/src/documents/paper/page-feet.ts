import type { Pdf } from './open-paper';
import { pageMargins, paperColours, textStyles } from './paper-colours';
import { fittedLine, writeLine } from './text-lines';

/** What stands at the foot of every page, and at the head of all but the first. */
export interface PageFeet {
  readonly head: string;
  readonly foot: string;
  /** "Page 2 of 5". */
  readonly pageOf: (page: number, pages: number) => string;
}

function writeFoot(pdf: Pdf, { foot, pageOf }: PageFeet, [page, pages]: readonly [number, number]): void {
  const { width, height } = pdf.page;
  const y_pt = height - pageMargins.bottom + 26;
  const style = textStyles.foot;
  pdf
    .lineWidth(0.6)
    .strokeColor(paperColours.line)
    .moveTo(pageMargins.left, y_pt - 6)
    .lineTo(width - pageMargins.right, y_pt - 6)
    .stroke();
  const width_pt = width - pageMargins.left - pageMargins.right - 90;
  writeLine(pdf, fittedLine(pdf, foot, { style, width_pt }), { style, place: { x_pt: pageMargins.left, y_pt } });
  writeLine(pdf, pageOf(page, pages), { style, place: { x_pt: width - pageMargins.right, y_pt, align: 'right' } });
}

/** Writes head and foot on all pages, once it is known how many there are; they are seen and not read out. */
export function writePageFeet(pdf: Pdf, feet: PageFeet): void {
  const { start, count } = pdf.bufferedPageRange();
  for (let index = 0; index < count; index += 1) {
    pdf.switchToPage(start + index);
    pdf.markContent('Artifact', { type: 'Pagination' });
    writeFoot(pdf, feet, [index + 1, count]);
    const place = { x_pt: pageMargins.left, y_pt: pageMargins.top - 26 };
    const style = textStyles.foot;
    const width_pt = pdf.page.width - pageMargins.left - pageMargins.right;
    if (index > 0) writeLine(pdf, fittedLine(pdf, feet.head, { style, width_pt }), { style, place });
    pdf.endMarkedContent();
  }
}
