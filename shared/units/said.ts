/** The two ways a maker reads lengths. */
export type Unit = 'cm' | 'in';

/**
 * A length in a sentence, millimetres; worded in the reader's unit only when it is spoken. `fine`
 * asks for a tenth of a millimetre, as the proof needs.
 */
export type SaidLength = {
  readonly mm: number;
  readonly fine?: true;
  /** Keys of the measures it is, or rests on, where the sentence knows them. */
  readonly of?: readonly string[];
};

/** An angle in a sentence, degrees; `of` as with a length. */
export type SaidAngle = { readonly deg: number; readonly of?: readonly string[] };

/** A sentence with its quantities left open, so that one text serves both units. */
export type Said = readonly (string | SaidLength | SaidAngle)[];

/** What a number says of its source; nothing where no measure leads to it. */
const resting = (of: readonly string[]): { readonly of?: readonly string[] } =>
  of.length === 0 ? {} : { of };

/** A length for a sentence, millimetres: read to 1 mm or 1/16 inch; `of` names the measures it rests on. */
export const mm = (value: number, of: readonly string[] = []): SaidLength => ({
  mm: value,
  ...resting(of),
});

/** A length for a sentence of the proof, millimetres: read to a tenth of a millimetre. */
export const fine = (value: number): SaidLength => ({ mm: value, fine: true });

/** An angle for a sentence, degrees; `of` names the measures it rests on. */
export const deg = (value: number, of: readonly string[] = []): SaidAngle => ({
  deg: value,
  ...resting(of),
});

/**
 * Writes a sentence with its quantities in it: said`Bust ${mm(920)} is a quarter of …`. A plain
 * number is a count and is written as it is; another sentence is taken in whole.
 */
export function said(
  strings: TemplateStringsArray,
  ...values: readonly (string | number | SaidLength | SaidAngle | Said)[]
): Said {
  const parts: (string | SaidLength | SaidAngle)[] = [];
  const put = (part: string | SaidLength | SaidAngle): void => {
    const last = parts.at(-1);
    if (typeof part === 'string' && typeof last === 'string') parts[parts.length - 1] = last + part;
    else if (part !== '') parts.push(part);
  };
  strings.forEach((text, index) => {
    put(text);
    const value = values[index];
    if (value === undefined) return;
    if (typeof value === 'number') put(String(value));
    else if (typeof value === 'string' || 'mm' in value || 'deg' in value) put(value);
    else value.forEach(put);
  });
  return parts;
}
