import type { Path } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';
import type { Mark, Pen, Strokes, Words } from '#shared/exports/drawing.ts';
import type { PdfFont } from './pdf-font.ts';

export type Fonts = { readonly regular: PdfFont; readonly heavy: PdfFont };

/** Hundredths of a millimetre: a tenth of what the print tests allow, and short to write. */
const n = (value: number): string => {
  const rounded = Math.round(value * 100) / 100;
  return rounded === 0 ? '0' : String(rounded);
};

/** Turns keep more digits: they act on lengths of two metres. */
const f = (value: number): string => {
  const rounded = Math.round(value * 1e6) / 1e6;
  return rounded === 0 ? '0' : String(rounded);
};

const at = ({ x, y }: Point): string => `${n(x)} ${n(y)}`;

/** Ends that differ by less than is written down are one place, or a closed outline would fall apart. */
const parted = (a: Point, b: Point): boolean =>
  Math.abs(a.x - b.x) > 0.005 || Math.abs(a.y - b.y) > 0.005;

function pathOperators(path: Path): string {
  let out = '';
  let last: Point | undefined;
  for (const segment of path) {
    if (!last || parted(last, segment.from)) out += `${at(segment.from)} m\n`;
    out +=
      segment.kind === 'line'
        ? `${at(segment.to)} l\n`
        : `${at(segment.c1)} ${at(segment.c2)} ${at(segment.to)} c\n`;
    last = segment.to;
  }
  return out;
}

/** Characters no printer shows: controls, direction marks, joiners. */
const unseen = /\p{C}/gu;

/**
 * The operators of a page or form. Written by hand: a page is a few hundred bytes, and a library that
 * keeps an object per operator takes ten times as long.
 */
export function contentOf(
  marks: readonly Mark[],
  fonts: Fonts,
  names: ReadonlyMap<string, string>,
  layers: ReadonlyMap<string, string> = new Map(),
): string {
  // A form starts in whatever state its page is in, so the first mark always says its own.
  let pen: Pen | undefined;
  let fill: number | undefined;

  const takePen = (next: Pen): string => {
    const parts: string[] = [];
    const dash = (each: Pen): string => (each.dash ?? []).map(n).join(' ');
    if (next.width !== pen?.width) parts.push(`${n(next.width)} w`);
    if (!pen || dash(next) !== dash(pen)) parts.push(`[${dash(next)}] 0 d`);
    if (!pen || (next.grey ?? 0) !== (pen.grey ?? 0)) parts.push(`${n(next.grey ?? 0)} G`);
    pen = next;
    return parts.length === 0 ? '' : `${parts.join(' ')}\n`;
  };
  const takeFill = (grey: number): string => {
    if (grey === fill) return '';
    fill = grey;
    return `${n(grey)} g\n`;
  };

  const strokesOperators = ({ paths, pen: next, closed }: Strokes): string => {
    const drawn = paths.filter((each) => each.length > 0);
    if (drawn.length === 0) return '';
    return `${takePen(next)}${drawn.map((each) => pathOperators(each) + (closed ? 'h\n' : '')).join('')}S\n`;
  };

  const wordsOperators = ({ text, at: place, size, anchor, heavy, grey, turn }: Words): string => {
    const { glyphs, width } = (heavy ? fonts.heavy : fonts.regular).set(
      text.normalize('NFC').replace(unseen, ' '),
    );
    const angle = ((turn ?? 0) * Math.PI) / 180;
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    const back = anchor === 'end' ? width * size : anchor === 'middle' ? (width * size) / 2 : 0;
    const start = { x: place.x - back * cos, y: place.y - back * sin };
    return (
      `${takeFill(grey ?? 0)}BT /${heavy ? 'H' : 'R'} ${n(size)} Tf ` +
      `${f(cos)} ${f(sin)} ${f(sin)} ${f(-cos)} ${at(start)} Tm <${glyphs}> Tj ET\n`
    );
  };

  /** What happens between q and Q leaves no trace on pen and ink. */
  const apart = (write: () => string): string => {
    const [keptPen, keptFill] = [pen, fill];
    const inner = write();
    [pen, fill] = [keptPen, keptFill];
    return `q ${inner}Q\n`;
  };

  const write = (mark: Mark): string => {
    switch (mark.kind) {
      case 'strokes':
        return strokesOperators(mark);
      case 'words':
        return wordsOperators(mark);
      case 'area':
        return `${takeFill(mark.grey)}${mark.corners.map((each, i) => `${at(each)} ${i === 0 ? 'm' : 'l'}\n`).join('')}f\n`;
      case 'use': {
        const { cos, sin, dx, dy } = mark.motion;
        const still = cos === 1 && sin === 0 && dx === 0 && dy === 0;
        const name = names.get(mark.drawing);
        if (name === undefined) throw new Error(`No drawing is called ${mark.drawing}.`);
        if (still) return `/${name} Do\n`;
        return apart(
          () => `${f(cos)} ${f(sin)} ${f(-sin)} ${f(cos)} ${n(dx)} ${n(dy)} cm /${name} Do\n`,
        );
      }
      case 'layer': {
        const layer = layers.get(mark.layer);
        if (layer === undefined) throw new Error(`No layer is called ${mark.layer}.`);
        return `/OC /${layer} BDC\n${apart(() => mark.marks.map(write).join(''))}EMC\n`;
      }
      case 'window': {
        const { x, y, width, height } = mark.box;
        return apart(
          () =>
            `${n(x)} ${n(y)} ${n(width)} ${n(height)} re W n\n${mark.marks.map(write).join('')}`,
        );
      }
    }
  };

  return marks.map(write).join('');
}
