import { said, type Said } from '#shared/units/said.ts';

/** Reads a plain number as people write it: `2`, `2.5`, `2,5`, `45 %`, `−3`. */
export function parseNumber(text: string): number | { readonly said: Said } {
  const plain = text
    .trim()
    .replace(/[\s ]*%$/, '')
    .replace(',', '.')
    .replace('−', '-');
  const value = /^[+-]?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : Number.NaN;
  if (Number.isFinite(value)) return value;
  return { said: said`“${text.trim().slice(0, 20)}” is not a number: type it like 2 or 2.5.` };
}
