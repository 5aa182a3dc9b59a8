import { point } from '../../geometry/point.ts';
import { profileLength, slopeAt, xAt } from '../../geometry/profile.ts';
import type { Half } from './half.ts';
import { type GownStyle, isOffShoulder } from './style-card.ts';
import type { TopLinePoints } from './top-line.ts';
import { heightAtArc } from './truing.ts';

/** Off the shoulder the top line ends inside the side line by this, and by this part of the armhole's height (our rule). */
const insideSide = 12;
const hollowShare = 0.35;
/** A shallow armhole is not drawn wider than this many times its height (our rule). */
const widestShare = 1.5;
/** It passes the princess line or dart by this at least, so that the seam ends in the top line (our rule). */
export const outsideAxis = 35;

/** What the top line of a half is drawn from: half the width of the body there, and its opening. */
export type TopWidth = { readonly halfAcross: number; readonly opening: number };

/** Where the top line of a half runs, and ends. */
export function topLinePoints(
  half: Half,
  front: Half,
  style: GownStyle,
  width: TopWidth,
): TopLinePoints {
  const end = isOffShoulder(style) ? shoulderEnd(half, style, width) : sideEnd(half, front, style);
  return half.side === 'front'
    ? frontTopLine(style, half.axis, end)
    : { centre: point(0, half.levels.waist - style.backDepth), ...end };
}

type End = Pick<TopLinePoints, 'side' | 'sideLean'>;

/** Strapless: at the side seam, the back's at the same length from the waist as the front's. */
function sideEnd(half: Half, front: Half, style: GownStyle): End {
  const arc = profileLength(front.line, style.sideDepth, front.heights.waist);
  const y = half.side === 'front' ? style.sideDepth : heightAtArc(half, arc);
  return { side: point(xAt(half.line, y), y), sideLean: slopeAt(half.line, y) };
}

/** Off the shoulder: at the armhole, half the width across out, and the opening more. */
function shoulderEnd(half: Half, style: GownStyle, { halfAcross, opening }: TopWidth): End {
  const { underarm } = half.heights;
  const height = underarm - style.sideDepth;
  const side = xAt(half.line, underarm);
  const most = side - Math.max(insideSide, hollowShare * height);
  const least = Math.max(
    Math.max(halfAcross, half.axis + outsideAxis) + opening,
    side - widestShare * height,
  );
  return { side: point(Math.min(least, most), style.sideDepth) };
}

function frontTopLine(style: GownStyle, axis: number, end: End): TopLinePoints {
  if (style.topLine === 'straight') {
    // Level from the centre to the princess line or dart, falling only from there to the side.
    return { centre: point(0, style.topDrop), peak: point(axis, style.topDrop), ...end };
  }
  return {
    centre: point(0, style.neckDepth),
    peak: point(style.neckWidth, style.topDrop),
    shape: style.topLine,
    ...end,
  };
}
