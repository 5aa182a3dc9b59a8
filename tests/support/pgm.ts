import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';

const run = promisify(execFile);

/** A grey picture, ten pixels a millimetre; 0 is ink, 255 paper. */
export type Picture = {
  readonly width: number;
  readonly height: number;
  readonly grey: (x: number, y: number) => number;
};

/** Part of a page, mm. */
export type Part = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};

/** Reads a binary PGM of one byte a pixel. */
export function readPgm(bytes: Buffer): Picture {
  const head = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(bytes.subarray(0, 40).toString('latin1'));
  if (!head) throw new Error('Not a PGM of one byte a pixel.');
  const [width, height] = [Number(head[1]), Number(head[2])];
  const start = head[0].length;
  return {
    width,
    height,
    grey: (x, y) =>
      x < 0 || y < 0 || x >= width || y >= height ? 255 : (bytes[start + y * width + x] ?? 255),
  };
}

/** Gives some work a file with these bytes, and removes it afterwards. */
export async function withFile<T>(
  bytes: Uint8Array,
  work: (file: string) => Promise<T>,
): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'ellwand-print-'));
  try {
    const file = join(folder, 'sheet.pdf');
    await writeFile(file, bytes);
    return await work(file);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Renders part of a page with poppler at 254 dpi, so that a pixel is a tenth of a millimetre. */
export const renderPart = (pdf: Uint8Array, page: number, part: Part): Promise<Picture> =>
  withFile(pdf, async (file) => {
    const pixels = (mm: number): string => String(Math.round(mm * 10));
    const { stderr } = await run('pdftoppm', [
      ...['-r', '254', '-gray', '-singlefile', '-f', String(page), '-l', String(page)],
      ...['-x', pixels(part.x), '-y', pixels(part.y)],
      ...['-W', pixels(part.width), '-H', pixels(part.height)],
      file,
      `${file}.page`,
    ]);
    if (stderr !== '') throw new Error(`poppler complains: ${stderr}`);
    return readPgm(await readFile(`${file}.page.pgm`));
  });

/** Runs one of poppler's or qpdf's commands on a PDF and gives what it printed. */
export const inspect = (
  pdf: Uint8Array,
  command: string,
  before: readonly string[] = [],
  after: readonly string[] = [],
): Promise<string> =>
  withFile(pdf, async (file) => (await run(command, [...before, file, ...after])).stdout);

/** Middles of the dark strokes along a row (or column) of pixels, in pixels, weighed by their darkness. */
export function strokesAlong(
  picture: Picture,
  at: { readonly row: number } | { readonly column: number },
): readonly number[] {
  const row = 'row' in at;
  const length = row ? picture.width : picture.height;
  const dark = (i: number): number =>
    255 - (row ? picture.grey(i, at.row) : picture.grey('column' in at ? at.column : 0, i));
  const found: number[] = [];
  let [weight, moment, darkest] = [0, 0, 0];
  for (let i = 0; i <= length; i += 1) {
    const ink = i < length ? dark(i) : 0;
    if (ink > 8) {
      weight += ink;
      moment += ink * (i + 0.5);
      darkest = Math.max(darkest, ink);
    } else if (weight > 0) {
      if (darkest > 100) found.push(moment / weight);
      [weight, moment, darkest] = [0, 0, 0];
    }
  }
  return found;
}

/** How much ink lies in part of a picture, in fully black pixels; the part in pixels. */
export function inkIn(picture: Picture, part?: Part): number {
  const { x, y, width, height } = part ?? {
    x: 0,
    y: 0,
    width: picture.width,
    height: picture.height,
  };
  let ink = 0;
  for (let row = y; row < y + height; row += 1) {
    for (let column = x; column < x + width; column += 1) ink += 255 - picture.grey(column, row);
  }
  return ink / 255;
}
