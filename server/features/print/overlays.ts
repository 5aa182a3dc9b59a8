import type { CompareRequest, NestRequest } from '#shared/api/comparing.ts';
import { type Comparison, compareDrafts } from '#shared/compare/compare-drafts.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { comparePages } from '#shared/exports/compare-pages.ts';
import { compareSvg } from '#shared/exports/compare-svg.ts';
import type { PrintJob } from '#shared/exports/drawing.ts';
import { pieceTitles } from '#shared/exports/figure-words.ts';
import { nestPages } from '#shared/exports/nest-pages.ts';
import { nestSvg } from '#shared/exports/nest-svg.ts';
import { nestReport } from '#shared/regrade/nest-report.ts';
import { type Nest, nestOf } from '#shared/regrade/nest.ts';
import { SheetLimitError } from '#shared/sheets/sheet-limit.ts';
import type { Unit } from '#shared/units/said.ts';
import { draftAnyOrRefuse } from '../../drafting/draft-or-refuse.ts';
import { refusalFor } from '../../http/refusal.ts';
import { pdfBytes } from './pdf-document.ts';

/** Writes pages, or says that they are more than anybody would glue. */
async function written(job: () => PrintJob, unit: Unit): Promise<Uint8Array> {
  try {
    return await pdfBytes(job());
  } catch (error) {
    if (error instanceof SheetLimitError) throw refusalFor('not-drawable', [error.problem], unit);
    throw error;
  }
}

function compared({ first, second, align, unit }: CompareRequest) {
  const drafts = [draftAnyOrRefuse(first, unit), draftAnyOrRefuse(second, unit)] as const;
  const comparison: Comparison = compareDrafts(...drafts, align);
  return { comparison, titles: pieceTitles(...drafts) };
}

/** Two drafts over each other as pages. */
export function comparisonOf(wanted: CompareRequest): Promise<Uint8Array> {
  const { comparison, titles } = compared(wanted);
  const { names, unit, paper, scale } = wanted;
  return written(() => comparePages(comparison, { names, titles, unit, paper, scale }), unit);
}

/** Two drafts over each other as SVG. */
export function comparisonSvgOf(wanted: CompareRequest): Promise<Uint8Array> {
  const { comparison } = compared(wanted);
  const text = compareSvg(comparison, wanted.names, wanted.unit);
  return Promise.resolve(new TextEncoder().encode(text));
}

/** The sizes of a nest; what is wrong in its order is a refusal that names the fields. */
function nested({ inputs, nest, unit }: NestRequest): Nest {
  const base = draftAnyOrRefuse(inputs, unit);
  try {
    return nestOf(base, nest);
  } catch (error) {
    if (error instanceof DraftingError) throw refusalFor('bad-input', error.problems, unit);
    throw error;
  }
}

/** A nest as pages, with its report. */
export function nestPdfOf(wanted: NestRequest): Promise<Uint8Array> {
  const { align, lines, unit, paper, scale } = wanted;
  const nest = nested(wanted);
  const report = nestReport(nest, align);
  return written(() => nestPages(nest, { align, lines, report, unit, paper, scale }), unit);
}

/** A nest as SVG. */
export function nestSvgOf(wanted: NestRequest): Promise<Uint8Array> {
  const text = nestSvg(nested(wanted), wanted, wanted.unit);
  return Promise.resolve(new TextEncoder().encode(text));
}
