declare module 'fontkit' {
  /** A drawn sign, with the code points of the text it stands for. */
  export interface Glyph {
    readonly codePoints: readonly number[];
  }

  /** An opened font; `layout` is what tells the paper library that it is one. */
  export interface Font {
    layout(text: string, features?: readonly string[]): unknown;
    getGlyph(id: number, codePoints?: readonly number[]): Glyph;
  }

  /** Reads a font from its bytes. */
  export function create(bytes: Uint8Array): Font;
}
