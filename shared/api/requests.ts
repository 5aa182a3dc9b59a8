import { z } from 'zod';
import type { DraftInputs } from '../engine/draft.ts';
import { measureCard } from './card.ts';
import { printOrder } from './print-order.ts';
import { fillRules, rulesCard } from './rules.ts';
import { styleCard } from './style.ts';

const inputs = {
  card: measureCard,
  style: styleCard.prefault({}),
  rules: rulesCard.prefault({}).transform(fillRules),
};

/** What a draft is asked for with: a card, and a style and rules where they differ from the defaults. */
export const draftRequest = z.strictObject(inputs) satisfies z.ZodType<DraftInputs>;

/** What a print is asked for with. */
export const printRequest = z.strictObject({
  ...inputs,
  unit: z.enum(['cm', 'in']),
  paper: z.enum(['A4', 'Letter']),
  pieces: z.enum(['bodice-toile', 'whole-gown']),
});
export type PrintRequest = z.output<typeof printRequest>;

/** What sheets are asked for with: what is drafted, and how it is printed. */
export const sheetsRequest = z.strictObject({
  inputs: draftRequest,
  unit: z.enum(['cm', 'in']),
  order: printOrder.prefault({}),
});
export type SheetsRequest = z.output<typeof sheetsRequest>;
