declare module 'fontkit' {
  /** An opened font; `layout` is what tells the paper library that it is one. */
  export interface Font {
    layout(text: string, features?: readonly string[]): unknown;
  }

  /** Reads a font from its bytes. */
  export function create(bytes: Uint8Array): Font;
}
