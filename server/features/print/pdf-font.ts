/// <reference path="./fontkit.d.ts" />
import { deflateSync } from 'node:zlib';
import fontkit, { type Font, type Glyph } from 'fontkit';
import { type PDFContext, PDFRawStream, type PDFRef, PDFString } from 'pdf-lib';

/** A typeface being used in one document: it remembers which letters, and embeds only those. */
export type PdfFont = {
  /** The text as this font's glyph numbers, and its width for a type size of one. */
  set(text: string): { readonly glyphs: string; readonly width: number };
  embed(context: PDFContext): Promise<PDFRef>;
};

/** A font that has been read, with the small figures of its built fractions. */
export type Typeface = {
  readonly font: Font;
  readonly numerators: ReadonlyMap<string, Glyph>;
  readonly denominators: ReadonlyMap<string, Glyph>;
};

const slash = '\u2044';

/** Stands where the typeface has no letter for a character. */
const missing = 0x25a1;

type Letter = { readonly hex: string; readonly width: number };

const hex4 = (value: number): string => value.toString(16).padStart(4, '0');

const utf16 = (codePoint: number): string =>
  [...String.fromCodePoint(codePoint)]
    .flatMap((each) => [...each].flatMap(() => each.split('')))
    .map((unit) => hex4(unit.charCodeAt(0)))
    .join('');

/** Which characters the glyph numbers stand for, so that the text can be searched and read aloud. */
function unicodeMap(characters: readonly (readonly [string, number])[]): string {
  const rows: string[] = [];
  for (let start = 0; start < characters.length; start += 100) {
    const some = characters.slice(start, start + 100);
    rows.push(
      `${some.length} beginbfchar`,
      ...some.map(([glyph, codePoint]) => `<${glyph}><${utf16(codePoint)}>`),
      'endbfchar',
    );
  }
  return [
    '/CIDInit /ProcSet findresource begin 12 dict begin begincmap',
    '/CIDSystemInfo << /Registry (Adobe) /Ordering (UCS) /Supplement 0 >> def',
    '/CMapName /Adobe-Identity-UCS def /CMapType 2 def',
    '1 begincodespacerange <0000><ffff> endcodespacerange',
    ...rows,
    'endcmap CMapName currentdict /CMap defineresource pop end end',
  ].join('\n');
}

const collect = (stream: NodeJS.ReadableStream): Promise<Buffer> =>
  new Promise((resolve, reject) => {
    const parts: Buffer[] = [];
    stream.on('data', (part: Uint8Array) => parts.push(Buffer.from(part)));
    stream.on('end', () => resolve(Buffer.concat(parts)));
    stream.on('error', reject);
  });

const packed = (
  context: PDFContext,
  bytes: Uint8Array,
  entries: Record<string, number> = {},
): PDFRef => {
  const body = deflateSync(bytes, { level: 9 });
  const dict = context.obj({ Filter: 'FlateDecode', Length: body.length, ...entries });
  return context.register(PDFRawStream.of(dict, body));
};

/** Begins using a typeface in a document; `tag` keeps the subsets of one document apart. */
export function useFont(typeface: Typeface, tag: string): PdfFont {
  const { font } = typeface;
  const subset = font.createSubset();
  const letters = new Map<number, Letter>();
  const characters: [string, number][] = [];
  const widths: number[] = [font.glyphForCodePoint(missing).advanceWidth];

  const take = (glyph: Glyph, codePoint: number): Letter => {
    const number = subset.includeGlyph(glyph);
    const letter = { hex: hex4(number), width: glyph.advanceWidth / font.unitsPerEm };
    if (widths[number] === undefined) characters.push([letter.hex, codePoint]);
    widths[number] = glyph.advanceWidth;
    return letter;
  };

  const letterFor = (codePoint: number): Letter => {
    const known = letters.get(codePoint);
    if (known) return known;
    if (!font.hasGlyphForCodePoint(codePoint)) {
      const box = letterFor(missing);
      letters.set(codePoint, box);
      return box;
    }
    const letter = take(font.glyphForCodePoint(codePoint), codePoint);
    letters.set(codePoint, letter);
    return letter;
  };

  /** Figures round a fraction slash, as the small figures of a built fraction. */
  const fraction = (text: string): readonly Letter[] => {
    let small = typeface.numerators;
    return Array.from(text, (each) => {
      if (each === slash) small = typeface.denominators;
      const codePoint = each.codePointAt(0) ?? missing;
      const glyph = small.get(each);
      return glyph ? take(glyph, codePoint) : letterFor(codePoint);
    });
  };

  return {
    set(text) {
      const line = text
        .split(/(\d+\u2044\d+)/u)
        .flatMap((part, i) =>
          i % 2 === 1
            ? fraction(part)
            : Array.from(part, (each) => letterFor(each.codePointAt(0) ?? missing)),
        );
      return {
        glyphs: line.map((each) => each.hex).join(''),
        width: line.reduce((sum, each) => sum + each.width, 0),
      };
    },
    async embed(context) {
      const program = await collect(subset.encodeStream());
      const em = 1000 / font.unitsPerEm;
      const { minX, minY, maxX, maxY } = font.bbox;
      const name = `${tag}+${font.postscriptName}`;
      const descriptor = context.register(
        context.obj({
          Type: 'FontDescriptor',
          FontName: name,
          Flags: 4,
          FontBBox: [minX, minY, maxX, maxY].map((each) => Math.round(each * em)),
          ItalicAngle: font.italicAngle,
          Ascent: Math.round(font.ascent * em),
          Descent: Math.round(font.descent * em),
          CapHeight: Math.round(font.capHeight * em),
          StemV: 80,
          FontFile2: packed(context, program, { Length1: program.length }),
        }),
      );
      const descendant = context.register(
        context.obj({
          Type: 'Font',
          Subtype: 'CIDFontType2',
          BaseFont: name,
          CIDToGIDMap: 'Identity',
          CIDSystemInfo: {
            Registry: PDFString.of('Adobe'),
            Ordering: PDFString.of('Identity'),
            Supplement: 0,
          },
          FontDescriptor: descriptor,
          W: [0, widths.map((each) => Math.round(each * em))],
        }),
      );
      return context.register(
        context.obj({
          Type: 'Font',
          Subtype: 'Type0',
          BaseFont: name,
          Encoding: 'Identity-H',
          DescendantFonts: [descendant],
          ToUnicode: packed(context, Buffer.from(unicodeMap(characters), 'latin1')),
        }),
      );
    },
  };
}

const figures = Array.from('0123456789');

/**
 * Reads a TrueType font; its letters can then be used in any number of documents. The small figures are
 * looked up here, once: fontkit forgets what a glyph stands for when it embeds composites, and no
 * longer builds fractions after that.
 */
export function readFont(bytes: Uint8Array): Typeface {
  const font = fontkit.create(bytes);
  const small = figures.map((each) => font.layout(`${each}${slash}${each}`, ['frac']).glyphs);
  const pick = (place: number): ReadonlyMap<string, Glyph> =>
    new Map(
      small.flatMap((glyphs, i) => {
        const [figure, glyph] = [figures[i], glyphs[place]];
        return figure !== undefined && glyph ? [[figure, glyph] as const] : [];
      }),
    );
  return { font, numerators: pick(0), denominators: pick(2) };
}
