import { readFileSync } from 'node:fs';
import {
  PDFDocument,
  type PDFFont,
  type PDFPage,
  clip,
  degrees,
  endPath,
  grayscale,
  popGraphicsState,
  pushGraphicsState,
  rectangle,
} from 'pdf-lib';
import type { Mark, PrintJob, Window, Words } from '#shared/exports/drawing.ts';
import { type Motion, moved, movedPath, shift } from '#shared/geometry/motion.ts';
import type { Path } from '#shared/geometry/path.ts';
import { toPoints } from '#shared/sheets/papers.ts';
import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';
import { printerMargin } from '#shared/sheets/tile-grid.ts';
import { fontkitForPdfLib } from '../support/fontkit-for-pdf-lib.ts';

type Fonts = { readonly regular: PDFFont; readonly heavy: PDFFont };

const read = (file: string): Uint8Array =>
  readFileSync(new URL(`../../server/features/print/fonts/${file}`, import.meta.url));
const regular = read('SourceSans3-Regular.ttf');
const heavy = read('SourceSans3-Semibold.ttf');

async function fontsIn(pdf: PDFDocument): Promise<Fonts> {
  pdf.registerFontkit(fontkitForPdfLib());
  return {
    regular: await pdf.embedFont(regular, { subset: true }),
    heavy: await pdf.embedFont(heavy, { subset: true }),
  };
}

const n = (mm: number): string => String(Math.round(toPoints(mm) * 1000) / 1000);

const svgPath = (path: Path, closed: boolean): string =>
  path
    .map((each, i) => {
      const start = i === 0 ? `M${n(each.from.x)},${n(each.from.y)}` : '';
      return each.kind === 'line'
        ? `${start}L${n(each.to.x)},${n(each.to.y)}`
        : `${start}C${n(each.c1.x)},${n(each.c1.y)} ${n(each.c2.x)},${n(each.c2.y)} ${n(each.to.x)},${n(each.to.y)}`;
    })
    .join('') + (closed ? 'Z' : '');

/** Marks drawn with pdf-lib's own verbs; `height` is the page's, mm. */
function draw(
  page: PDFPage,
  marks: readonly Mark[],
  fonts: Fonts,
  motion: Motion,
  height: number,
): void {
  for (const mark of marks) {
    if (mark.kind === 'strokes') {
      for (const path of mark.paths) {
        page.drawSvgPath(svgPath(movedPath(path, motion), mark.closed === true), {
          x: 0,
          y: toPoints(height),
          borderWidth: toPoints(mark.pen.width),
          borderColor: grayscale(mark.pen.grey ?? 0),
          ...(mark.pen.dash ? { borderDashArray: mark.pen.dash.map(toPoints) } : {}),
        });
      }
    } else if (mark.kind === 'area') {
      const corners = mark.corners.map((each) => moved(each, motion));
      page.drawSvgPath(`M${corners.map((each) => `${n(each.x)},${n(each.y)}`).join('L')}Z`, {
        x: 0,
        y: toPoints(height),
        color: grayscale(mark.grey),
      });
    } else if (mark.kind === 'words') {
      const font = mark.heavy ? fonts.heavy : fonts.regular;
      const size = toPoints(mark.size);
      const text = mark.text.normalize('NFC');
      const width = font.widthOfTextAtSize(text, size);
      const back = mark.anchor === 'end' ? width : mark.anchor === 'middle' ? width / 2 : 0;
      const turn = ((mark.turn ?? 0) * Math.PI) / 180 + Math.atan2(motion.sin, motion.cos);
      const at = moved(mark.at, motion);
      page.drawText(text, {
        font,
        size,
        color: grayscale(mark.grey ?? 0),
        x: toPoints(at.x) - back * Math.cos(turn),
        y: toPoints(height - at.y) + back * Math.sin(turn),
        rotate: degrees((-turn * 180) / Math.PI),
      });
    }
  }
}

/** The whole drawing on one large page, and after it each piece of sheet furniture on a page of its own. */
async function sourcePages(
  job: PrintJob,
  { layout }: SheetPlan,
  furniture: readonly string[],
  labels: readonly Words[] = [],
): Promise<Uint8Array> {
  const pdf = await PDFDocument.create({ updateMetadata: false });
  const fonts = await fontsIn(pdf);
  const page = pdf.addPage([toPoints(layout.width), toPoints(layout.height)]);
  const drawings = new Map(job.drawings.map((each) => [each.name, each.marks]));
  for (const { shape, motion } of layout.placements) {
    draw(page, drawings.get(shape.piece) ?? [], fonts, motion, layout.height);
  }
  draw(page, labels, fonts, shift(0, 0), layout.height);
  const { width, height } = job.paper;
  for (const name of furniture) {
    const sheet = pdf.addPage([toPoints(width), toPoints(height)]);
    draw(sheet, drawings.get(name) ?? [], fonts, shift(0, 0), height);
  }
  return pdf.save();
}

/** The whole drawing on one large page, the labels of the pieces too. */
export const largePage = (
  job: PrintJob,
  sheets: SheetPlan,
  labels: readonly Words[],
): Promise<Uint8Array> => sourcePages(job, sheets, [], labels);

const isWindow = (mark: Mark): mark is Window => mark.kind === 'window';

/**
 * The same tiles by pdf-lib's embedPdf route at its best: the large page and the sheets' furniture are
 * embedded once each and drawn shifted, clipped to the printed area; only small print is set anew.
 */
export async function embedPdfRoute(job: PrintJob, sheets: SheetPlan): Promise<Uint8Array> {
  const { layout, plan } = sheets;
  const pieces = new Set(layout.placements.map((each) => each.shape.piece));
  const furniture = job.drawings.map((each) => each.name).filter((each) => !pieces.has(each));
  const source = await sourcePages(job, sheets, furniture);
  const pdf = await PDFDocument.create({ updateMetadata: false });
  const fonts = await fontsIn(pdf);
  const [drawing, ...rest] = await pdf.embedPdf(source, [0, ...furniture.map((_, i) => i + 1)]);
  const height = job.paper.height;
  const margin = toPoints(printerMargin);
  for (const [i, marks] of job.pages.entries()) {
    const tile = plan.tiles[i];
    if (!tile || !drawing) continue;
    const page = pdf.addPage([toPoints(job.paper.width), toPoints(height)]);
    page.pushOperators(
      pushGraphicsState(),
      rectangle(margin, margin, toPoints(plan.use.width), toPoints(plan.use.height)),
      clip(),
      endPath(),
    );
    page.drawPage(drawing, {
      x: toPoints(printerMargin - tile.at.x),
      y: toPoints(height - printerMargin + tile.at.y - layout.height),
    });
    const flat = marks.flatMap((mark) => (isWindow(mark) ? mark.marks : [mark]));
    for (const mark of flat) {
      const form = mark.kind === 'use' ? rest[furniture.indexOf(mark.drawing)] : undefined;
      if (form && mark.kind === 'use') {
        page.drawPage(form, { x: toPoints(mark.motion.dx), y: -toPoints(mark.motion.dy) });
      }
    }
    page.pushOperators(popGraphicsState());
    draw(page, flat, fonts, shift(0, 0), height);
  }
  return pdf.save();
}
