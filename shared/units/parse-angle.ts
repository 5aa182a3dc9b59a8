import { said, type Said } from './said.ts';

/** Reads degrees as people type them (`22`, `22,5`, `22.5°`), or says what to type. */
export function parseAngle(typed: string): { readonly deg: number } | { readonly said: Said } {
  const text = typed
    .trim()
    .replace(/ ?(?:°|deg|degrees)$/u, '')
    .replace('\u2212', '-')
    .replace(',', '.');
  if (/^-?(?:\d{1,6}(?:\.\d{0,6})?|\.\d{1,6})$/u.test(text)) return { deg: Number(text) };
  return { said: said`This is not an angle: type degrees, such as 22 or 22.5.` };
}
