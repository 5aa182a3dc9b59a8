import { type FlarePlan, kneeWidths } from './flare-plan.ts';
import type { SkirtPanel } from './skirt-panel.ts';

/** A stretch of the knee seam between two seams of the flare or of the skirt above it, mm from the centre. */
export type KneeStretch = {
  readonly name: string;
  readonly from: number;
  readonly until: number;
  /** The gore below it, from the centre out, and the distance from the centre at which that gore begins. */
  readonly gore: number;
  readonly goreFrom: number;
  /** The piece above it. */
  readonly skirt: string;
};

/** Seams nearer than this on the knee seam are one: no stretch is shorter. */
const speck = 1e-6;

/** The knee seam of a half in stretches from the centre out, each with the one piece above and the one gore below. */
export function kneeStretches(
  plan: FlarePlan,
  panels: readonly SkirtPanel[],
): readonly KneeStretch[] {
  const widths = kneeWidths(plan);
  const whole = widths.reduce((sum, width) => sum + width, 0);
  const parts: Omit<KneeStretch, 'name'>[] = [];
  let goreFrom = 0;
  widths.forEach((width, gore) => {
    let from = goreFrom;
    const end = gore === widths.length - 1 ? whole : goreFrom + width;
    for (const { piece: skirt, outer, until } of panels) {
      const stop = outer === 'side' ? end : Math.min(end, until);
      if (stop - from <= speck) continue;
      parts.push({ from, until: stop, gore, goreFrom, skirt });
      from = stop;
    }
    goreFrom += width;
  });
  return parts.map((part, k) => ({
    name: parts.length === 1 ? 'knee' : `knee-${'abcdefghijklmnopqrstuvwxyz'[k] ?? String(k)}`,
    ...part,
  }));
}
