import type { Mark, Words } from './drawing.ts';
import { words } from './marks.ts';
import { wrap } from './type-width.ts';

/** A paragraph and the height below its last line at which the next one may begin. */
export type Block = { readonly marks: readonly Mark[]; readonly next: number };

type Look = Omit<Words, 'kind' | 'text' | 'at' | 'size'>;

/** Sets a paragraph with its first line's top at `y`, broken at `width` mm. */
export function paragraph(
  text: string,
  x: number,
  y: number,
  width: number,
  size: number,
  look: Look = {},
): Block {
  const leading = size * 1.32;
  const lines = wrap(text, size, width);
  return {
    marks: lines.map((line, i) => words(line, x, y + size * 0.8 + i * leading, size, look)),
    next: y + lines.length * leading,
  };
}

/** Paragraphs below one another with `gap` mm between. */
export function stack(blocks: readonly ((y: number) => Block)[], y: number, gap: number): Block {
  let next = y;
  const marks: Mark[] = [];
  for (const block of blocks) {
    const set = block(next);
    marks.push(...set.marks);
    next = set.next + gap;
  }
  return { marks, next: next - gap };
}
