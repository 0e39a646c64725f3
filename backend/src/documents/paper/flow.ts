import type { Pdf } from './open-paper';
import { pageMargins, paperColours } from './paper-colours';

/** What stands on a page by itself: it begins where its first part fits, and breaks where it may. */
export interface Block {
  /** Height in points that has to be free for it to begin. */
  readonly lead_pt: number;
  readonly place: (flow: Flow) => void;
}

export interface TagOptions {
  readonly alt?: string;
  readonly scope?: 'Column' | 'Row' | 'Both';
  readonly bbox?: readonly [number, number, number, number];
}

/** Where the next thing goes: pages one after another, and the tree of tags that reads them in order. */
export class Flow {
  private parent: PDFKit.PDFStructureElement;
  y = 0;

  constructor(readonly pdf: Pdf) {
    this.parent = pdf.struct('Document');
    pdf.addStructure(this.parent);
    this.breakPage();
  }

  readonly left = pageMargins.left;

  get width(): number {
    return this.pdf.page.width - pageMargins.left - pageMargins.right;
  }

  get right(): number {
    return this.left + this.width;
  }

  get bottom(): number {
    return this.pdf.page.height - pageMargins.bottom;
  }

  get room(): number {
    return this.bottom - this.y;
  }

  /** Height of an empty page. */
  get pageHeight(): number {
    return this.pdf.page.height - pageMargins.top - pageMargins.bottom;
  }

  breakPage(): void {
    this.pdf.addPage();
    this.y = pageMargins.top;
  }

  /** Starts a page unless so much is free on this one; says whether it did. */
  need(height_pt: number): boolean {
    if (height_pt <= this.room || this.y === pageMargins.top) return false;
    this.breakPage();
    return true;
  }

  /** Space before what follows, but none at the head of a page. */
  space(height_pt: number): void {
    if (this.y > pageMargins.top) this.y = Math.min(this.bottom, this.y + height_pt);
  }

  /** Everything that is written meanwhile stands under this tag. */
  inside(tag: string, write: () => void, options: TagOptions = {}): void {
    const outer = this.parent;
    const element = this.pdf.struct(tag, options);
    outer.add(element);
    this.parent = element;
    write();
    element.end();
    this.parent = outer;
  }

  /** Draws under the tag that is open. */
  draw(draw: () => void): void {
    this.parent.add(draw);
  }

  /** Draws something with a tag of its own. */
  tagged(tag: string, draw: () => void, options: TagOptions = {}): void {
    this.inside(tag, () => this.draw(draw), options);
  }

  /** Draws what is looked at and never read out. */
  artifact(draw: () => void, type: 'Layout' | 'Pagination' = 'Layout'): void {
    this.pdf.markContent('Artifact', { type });
    draw();
    this.pdf.endMarkedContent();
  }

  /** A hairline over the whole width. */
  rule(y_pt: number, colour: string = paperColours.line, weight_pt = 0.6): void {
    const { left, right } = this;
    this.artifact(() =>
      this.pdf.lineWidth(weight_pt).strokeColor(colour).moveTo(left, y_pt).lineTo(right, y_pt).stroke(),
    );
  }

  /** Ends the tree of tags. */
  end(): void {
    this.parent.end();
  }
}
