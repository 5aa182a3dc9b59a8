import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { draftRequest } from './requests.ts';

/** What a worksheet is asked for with: what is drafted, for which reader, on which paper. */
export const worksheetRequest = z.strictObject({
  inputs: draftRequest,
  unit: z.enum(['cm', 'in']),
  paper: z.enum(['A4', 'Letter']),
});
export type WorksheetRequest = z.output<typeof worksheetRequest>;

/** Every step with its figure and its sentence, for a learner's folder. */
export const printWorksheet = endpoint({
  method: 'POST',
  path: '/api/prints/worksheet',
  body: worksheetRequest,
  reply: { kind: 'file', mediaType: 'application/pdf' },
});
