import fontkit from 'fontkit';
import type { PDFDocument } from 'pdf-lib';

type Fontkit = Parameters<PDFDocument['registerFontkit']>[0];

/** fontkit as pdf-lib knows it: pdf-lib describes an older copy of the same program. */
export function fontkitForPdfLib(): Fontkit {
  const kit: unknown = fontkit;
  return kit as Fontkit;
}
