import { type Said, mm, said } from '../units/said.ts';

/** A length together with the arithmetic that led to it, and the keys of the measures it rests on. */
export type Quantity = {
  readonly value: number;
  readonly how: Said;
  /** Whether the words already end with what it comes to. */
  readonly stated?: boolean;
  readonly measures: readonly string[];
};

/** A measure of the body as its card gives it; an estimate says so wherever it is spoken. */
export const taken = (name: string, key: string, value: number, estimated: boolean): Quantity => ({
  value,
  how: said`${name} ${mm(value, [key])}${estimated ? ' (estimated)' : ''}`,
  measures: [key],
});

/** Less reads as nothing in either unit, mm: such an amount is added in silence. */
export const leastSaid = 0.5;

/** An amount for a sentence, mm; the word where there is none to speak of. */
export const amount = (value: number, of: readonly string[] = []): Said =>
  Math.abs(value) < leastSaid ? said`nothing` : said`${mm(value, of)}`;

/** The same length with a named amount added; a taken-off amount is negative. */
export const plus = (quantity: Quantity, name: string, amount: number): Quantity => ({
  value: quantity.value + amount,
  stated: Math.abs(amount) < leastSaid && quantity.stated === true,
  how:
    Math.abs(amount) < leastSaid
      ? quantity.how
      : said`${quantity.how} ${amount < 0 ? '−' : '+'} ${name} ${mm(Math.abs(amount))}`,
  measures: quantity.measures,
});

/** A quarter of a girth. */
export const quarterOf = (girth: Quantity): Quantity => ({
  value: girth.value / 4,
  how: said`a quarter of (${girth.how}) = ${mm(girth.value / 4, girth.measures)}`,
  stated: true,
  measures: girth.measures,
});

/** The whole sum: how it was worked out, and what it comes to. */
export const worked = (quantity: Quantity): Said =>
  quantity.stated === true
    ? quantity.how
    : said`${quantity.how} = ${mm(quantity.value, quantity.measures)}`;
