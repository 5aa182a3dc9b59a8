import { formatFine, formatLength } from '#shared/units/format-length.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import type { Said, Unit } from '#shared/units/said.ts';

/** What stands in a field of the print room: the letters typed, and the length they mean, mm, if any. */
export type TypedLength = {
  readonly text: string;
  readonly read: { readonly mm: number } | { readonly said: Said };
};

/** Letters as a length in the reader's unit. */
export const readLength = (text: string, unit: Unit): TypedLength => ({
  text,
  read: parseLength(text, unit),
});

/** A length as it stands in a field of the reader's unit. */
export const writtenLength = (mm: number, unit: Unit): TypedLength => ({
  text: formatLength(mm, unit),
  read: { mm },
});

/** The same field for a reader of another unit; what could not be read stays as it was typed. */
export const rewrittenLength = (typed: TypedLength, unit: Unit): TypedLength =>
  'mm' in typed.read ? writtenLength(typed.read.mm, unit) : readLength(typed.text, unit);

/** The same for what was read off a ruler, which counts to the half millimetre. */
export const rewrittenFine = (typed: TypedLength, unit: Unit): TypedLength =>
  'mm' in typed.read
    ? { ...typed, text: formatFine(typed.read.mm, unit) }
    : readLength(typed.text, unit);
