// What we use of fontkit, which brings no types of its own.
declare module 'fontkit' {
  /** A parsed font. */
  export interface Font {
    glyphForCodePoint(codePoint: number): unknown;
    layout(text: string): unknown;
  }
  export function create(file: Uint8Array): Font;
}
