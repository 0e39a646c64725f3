/** Something drawn: its size in points, what it shows in words, and how to draw it with its top left corner at a place. */
export interface Figure {
  readonly width_pt: number;
  readonly height_pt: number;
  readonly alt: string;
  readonly draw: (x_pt: number, y_pt: number) => void;
}

/** A figure with a line or two under it. */
export interface CaptionedFigure {
  readonly figure: Figure;
  readonly caption: string;
  readonly note: string;
}
