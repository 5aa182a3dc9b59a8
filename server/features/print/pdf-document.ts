import { readFileSync } from 'node:fs';
import { deflateSync } from 'node:zlib';
import {
  PDFContext,
  PDFHeader,
  PDFHexString,
  PDFRawStream,
  type PDFRef,
  PDFStreamWriter,
  PDFString,
} from 'pdf-lib';
import type { Drawing, Mark, PrintJob } from '#shared/exports/drawing.ts';
import { toPoints } from '#shared/sheets/papers.ts';
import { contentOf, type Fonts } from './page-content.ts';
import { type Typeface, readFont, useFont } from './pdf-font.ts';

const read = (file: string): Typeface =>
  readFont(readFileSync(new URL(`./fonts/${file}`, import.meta.url)));

let typeface: { readonly regular: Typeface; readonly heavy: Typeface } | undefined;

/** Read once a process: half a megabyte each, the same for every document. */
const typefaces = (): { readonly regular: Typeface; readonly heavy: Typeface } =>
  (typeface ??= {
    regular: read('SourceSans3-Regular.ttf'),
    heavy: read('SourceSans3-Semibold.ttf'),
  });

/** Six decimals of a point are less than a millionth of a millimetre. */
const exact = (points: number): number => Math.round(points * 1e6) / 1e6;

type Entries = Record<string, string | number | number[] | PDFRef>;

function stream(context: PDFContext, content: string, entries: Entries = {}): PDFRef {
  const body = deflateSync(Buffer.from(content, 'latin1'), { level: 9 });
  const dict = context.obj({ ...entries, Filter: 'FlateDecode', Length: body.length });
  return context.register(PDFRawStream.of(dict, body));
}

/** A box that surely holds a drawing: its points and a hand's breadth, for letters that stand out. */
function reachOf(marks: readonly Mark[]): readonly number[] {
  let [left, top, right, bottom] = [0, 0, 0, 0];
  const reach = (x: number, y: number): void => {
    left = Math.min(left, x);
    top = Math.min(top, y);
    right = Math.max(right, x);
    bottom = Math.max(bottom, y);
  };
  for (const mark of marks) {
    if (mark.kind === 'words') reach(mark.at.x, mark.at.y);
    if (mark.kind === 'area') for (const each of mark.corners) reach(each.x, each.y);
    if (mark.kind !== 'strokes') continue;
    for (const segment of mark.paths.flat()) {
      const corners =
        segment.kind === 'line'
          ? [segment.from, segment.to]
          : [segment.from, segment.c1, segment.c2, segment.to];
      for (const each of corners) reach(each.x, each.y);
    }
  }
  return [left - 80, top - 80, right + 80, bottom + 80].map(Math.round);
}

/** Marks of layers beside all others. */
const unlayered = (marks: readonly Mark[]): readonly Mark[] =>
  marks.flatMap((mark) => (mark.kind === 'layer' ? unlayered(mark.marks) : [mark]));

function form(
  context: PDFContext,
  drawing: Drawing,
  fonts: Fonts,
  lettering: PDFRef,
  layers: ReadonlyMap<string, string>,
): PDFRef {
  return stream(context, contentOf(drawing.marks, fonts, new Map(), layers), {
    Type: 'XObject',
    Subtype: 'Form',
    BBox: [...reachOf(unlayered(drawing.marks))],
    Resources: lettering,
  });
}

/** `2026-11-14` as a PDF date; a date written otherwise is left out, for nothing else may enter the file unescaped. */
const createdOn = (day: string | undefined): Record<string, PDFString> =>
  day !== undefined && /^\d{4}-\d{2}-\d{2}$/u.test(day)
    ? { CreationDate: PDFString.of(`D:${day.replaceAll('-', '')}000000Z`) }
    : {};

/**
 * The bytes of a print job: vector, fonts embedded, drawings once as form objects, told to print at
 * 100 %. The same job gives the same bytes.
 */
export async function pdfBytes(job: PrintJob): Promise<Uint8Array> {
  const context = PDFContext.create();
  context.header = PDFHeader.forVersion(1, 7);
  const { regular, heavy } = typefaces();
  const fonts = { regular: useFont(regular, 'ELLWRG'), heavy: useFont(heavy, 'ELLWSB') };
  const lettering = context.nextRef();
  const pageResources = context.nextRef();
  const tree = context.nextRef();

  const layers = (job.layers ?? []).map((name, i) => ({
    name,
    key: `L${i}`,
    group: context.register(context.obj({ Type: 'OCG', Name: PDFHexString.fromText(name) })),
  }));
  const keys = new Map(layers.map(({ name, key }) => [name, key]));
  const properties =
    layers.length === 0
      ? {}
      : { Properties: Object.fromEntries(layers.map(({ key, group }) => [key, group])) };
  const groups = layers.map(({ group }) => group);

  const names = new Map(job.drawings.map((each, i) => [each.name, `D${i}`]));
  const forms = Object.fromEntries(
    job.drawings.map((each, i) => [`D${i}`, form(context, each, fonts, lettering, keys)]),
  );
  const k = exact(toPoints(1));
  const height = exact(toPoints(job.paper.height));
  const pages = job.pages.map((marks) =>
    context.register(
      context.obj({
        Type: 'Page',
        Parent: tree,
        Contents: stream(
          context,
          `${k} 0 0 -${k} 0 ${height} cm\n${contentOf(marks, fonts, names, keys)}`,
        ),
      }),
    ),
  );
  const named = { R: await fonts.regular.embed(context), H: await fonts.heavy.embed(context) };
  context.assign(lettering, context.obj({ Font: named, ...properties }));
  context.assign(pageResources, context.obj({ Font: named, XObject: forms, ...properties }));
  context.assign(
    tree,
    context.obj({
      Type: 'Pages',
      Kids: pages,
      Count: pages.length,
      MediaBox: [0, 0, exact(toPoints(job.paper.width)), height],
      Resources: pageResources,
    }),
  );
  context.trailerInfo.Root = context.register(
    context.obj({
      Type: 'Catalog',
      Pages: tree,
      Lang: PDFString.of('en-GB'),
      ViewerPreferences: { PrintScaling: 'None', DisplayDocTitle: true },
      ...(groups.length === 0
        ? {}
        : { OCProperties: { OCGs: groups, D: { Order: groups, ON: groups } } }),
    }),
  );
  context.trailerInfo.Info = context.register(
    context.obj({
      Title: PDFHexString.fromText(job.title),
      Producer: PDFString.of('Ellwand'),
      ...createdOn(job.date),
    }),
  );
  return PDFStreamWriter.forContext(context, Infinity, true, 500).serializeToBuffer();
}
