/** The colours of the product on white paper; gold is kept for what is gold and for one line under the letterhead. */
export const paperColours = {
  ink: '#2c2019',
  muted: '#6e5e4e',
  line: '#e6dccb',
  tint: '#f4ebdc',
  bole: '#8a2e22',
  ochre: '#b97f1f',
  gold: '#c9a24b',
  warn: '#8f5b00',
  paper: '#ffffff',
} as const;

export type PaperFont = 'heading' | 'text' | 'medium' | 'bold';

/** How a text is set: font, size and height of a line in points, colour. */
export interface TextStyle {
  readonly font: PaperFont;
  readonly size_pt: number;
  readonly leading_pt: number;
  readonly colour: string;
}

const style = (font: PaperFont, size_pt: number, leading_pt: number): TextStyle => ({
  ...{ font, size_pt, leading_pt },
  colour: paperColours.ink,
});

const muted = (plain: TextStyle): TextStyle => ({ ...plain, colour: paperColours.muted });

/** The few styles all papers are set in. */
export const textStyles = {
  title: style('heading', 23, 28),
  heading: style('heading', 15, 19),
  subheading: style('heading', 12, 16),
  body: style('text', 10, 14),
  strong: style('bold', 10, 14),
  medium: style('medium', 10, 14),
  note: muted(style('text', 8.5, 11.5)),
  columnHead: muted(style('medium', 8.5, 11.5)),
  sum: style('bold', 12, 16),
  foot: muted(style('text', 8, 10)),
  dimension: muted(style('text', 7, 9)),
} as const;

/** Space of a page round its contents, in points: 20 mm at the sides, room for the foot below. */
export const pageMargins = { left: 57, right: 57, top: 54, bottom: 66 } as const;
