import type { Said } from '../units/said.ts';
import type { ProofLine } from './proof.ts';

/** What a proof comes to, in words: that the pieces sew together, or the first place that does not hold. */
export function verdictOf(lines: readonly ProofLine[]): Said {
  const failed = lines.flatMap((line) => line.findings.filter((each) => !each.holds));
  const [first, ...others] = failed;
  if (first === undefined) return ['These pieces sew together.'];
  const more =
    others.length === 0
      ? ''
      : ` ${others.length} more ${others.length === 1 ? 'place does' : 'places do'} not hold.`;
  return ['These pieces do not sew together yet. ', ...first.said, more];
}
