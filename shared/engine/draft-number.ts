const letters = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';

/**
 * Short number for a draft, the same for the same text: 25 bits of FNV-1a (Fowler, Noll, Vo) in
 * letters that cannot be mistaken for each other on paper.
 */
export function draftNumber(text: string): string {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i += 1) {
    hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193) >>> 0;
  }
  return Array.from({ length: 5 }, (_, k) => letters[(hash >>> (5 * k)) & 31] ?? '').join('');
}
