import type { Finding } from '#shared/proof/proof.ts';

/**
 * How far a finding may be off, in words. Bounds are finer than a tape in inches reads, so lengths stand in
 * millimetres; what carries neither length nor angle was counted.
 */
export function boundWords({ said, bound }: Finding): string {
  const holes = said.flatMap((part) => (typeof part === 'string' ? [] : Object.keys(part)));
  if (holes.includes('mm')) return `${bound} mm`;
  return holes.includes('deg') ? `${bound}°` : String(bound);
}
