/** The two ways a maker reads lengths. */
export type Unit = 'cm' | 'in';

/** A length in a sentence, millimetres; worded in the reader's unit only when it is spoken. */
export type SaidLength = { readonly mm: number };

/** An angle in a sentence, degrees. */
export type SaidAngle = { readonly deg: number };

/** A sentence with its quantities left open, so that one text serves both units. */
export type Said = readonly (string | SaidLength | SaidAngle)[];
