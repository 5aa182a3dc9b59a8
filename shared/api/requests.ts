import { z } from 'zod';
import type { DraftedInputs } from '../engine/drafted.ts';
import { bodiceBlockCard, skirtBlockCard } from './block-style.ts';
import { measureCard } from './card.ts';
import { printOrder } from './print-order.ts';
import { fillRules, rulesCard } from './rules.ts';
import { styleCard } from './style.ts';

const card = measureCard;
const rules = rulesCard.prefault({}).transform(fillRules);

const gown = { garment: z.literal('gown').optional(), card, style: styleCard.prefault({}), rules };
const bodiceBlock = {
  garment: z.literal('bodice-block'),
  card,
  style: bodiceBlockCard.prefault({}),
  rules,
};
const skirtBlock = {
  garment: z.literal('skirt-block'),
  card,
  style: skirtBlockCard.prefault({}),
  rules,
};

/**
 * What a draft is asked for with: a card, and a style and rules where they differ from the defaults; the style is
 * that of the garment named, a gown's where none is.
 */
export const draftRequest = z.discriminatedUnion('garment', [
  z.strictObject(gown),
  z.strictObject(bodiceBlock),
  z.strictObject(skirtBlock),
]) satisfies z.ZodType<DraftedInputs>;

const print = {
  unit: z.enum(['cm', 'in']),
  paper: z.enum(['A4', 'Letter']),
  pieces: z.enum(['bodice-toile', 'whole-gown']),
};

/** What a print is asked for with. */
export const printRequest = z.discriminatedUnion('garment', [
  z.strictObject({ ...gown, ...print }),
  z.strictObject({ ...bodiceBlock, ...print }),
  z.strictObject({ ...skirtBlock, ...print }),
]);
export type PrintRequest = z.output<typeof printRequest>;

/** What sheets are asked for with: what is drafted, and how it is printed. */
export const sheetsRequest = z.strictObject({
  inputs: draftRequest,
  unit: z.enum(['cm', 'in']),
  order: printOrder.prefault({}),
});
export type SheetsRequest = z.output<typeof sheetsRequest>;
