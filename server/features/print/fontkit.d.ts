/** The part of fontkit 1.9 that printing uses; the package ships no types of its own. */
declare module 'fontkit' {
  export type Glyph = { readonly id: number; readonly advanceWidth: number };
  export type Subset = {
    includeGlyph(glyph: Glyph | number): number;
    encodeStream(): NodeJS.ReadableStream;
  };
  export type Font = {
    readonly postscriptName: string;
    readonly unitsPerEm: number;
    readonly ascent: number;
    readonly descent: number;
    readonly capHeight: number;
    readonly italicAngle: number;
    readonly bbox: {
      readonly minX: number;
      readonly minY: number;
      readonly maxX: number;
      readonly maxY: number;
    };
    hasGlyphForCodePoint(codePoint: number): boolean;
    glyphForCodePoint(codePoint: number): Glyph;
    layout(text: string, features: readonly string[]): { readonly glyphs: readonly Glyph[] };
    createSubset(): Subset;
  };
  export function create(bytes: Uint8Array): Font;
  const fontkit: { create: typeof create };
  export default fontkit;
}
