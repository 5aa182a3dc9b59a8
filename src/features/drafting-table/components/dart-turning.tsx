import { useEffect, useRef, useState } from 'react';

import type { Piece } from '#shared/drafting/piece.ts';
import { turningFront } from '#shared/drafts/bodice-block/turning-dart.ts';
import type { BodiceBlockDraft } from '#shared/engine/draft-bodice-block.ts';
import { pathData } from '#shared/exports/path-data.ts';

import { useMedia } from '../../../lib/use-media.ts';

type DartTurningProps = { readonly draft: BodiceBlockDraft };

/** As long as the paper takes to turn, ms. */
const whole = 900;

/** The front of the block turning about the bust point from where its dart was to where it is sewn now. */
export const DartTurning = ({ draft }: DartTurningProps) => {
  const front = draft.pieces[0];
  const still = useMedia('(prefers-reduced-motion: reduce)');
  const shown = useTurning(front, draft, still);
  if (shown === undefined) return null;
  const { bustPoint } = draft;
  const height = draft.bodyLevels.waist + 30;
  return (
    <svg
      viewBox={`-10 -45 ${Math.round(height * 0.95)} ${Math.round(height + 55)}`}
      className="mx-auto h-44 fill-none stroke-ink"
      role="img"
      aria-label="Front of the block: the paper turns about the bust point until the dart lies where it is sewn."
    >
      {shown.edges
        .filter(({ open }) => open !== true)
        .map(({ name, kind, path }) => (
          <path
            key={name}
            d={pathData(path)}
            strokeWidth={3}
            strokeDasharray={kind === 'fold' ? '6 14' : undefined}
          />
        ))}
      {shown.darts.map(({ name, centreLeg, sideLeg }) => (
        <path
          key={name}
          d={`${pathData(centreLeg)}${pathData(sideLeg)}`}
          className="stroke-brass"
          strokeWidth={2}
        />
      ))}
      {bustPoint && <circle cx={bustPoint.x} cy={bustPoint.y} r={5} className="fill-brass" />}
    </svg>
  );
};

/** The piece to show: on its way from the one before, or as it is. */
function useTurning(
  front: Piece | undefined,
  { bustPoint, style }: BodiceBlockDraft,
  still: boolean,
): Piece | undefined {
  const last = useRef({ front, place: style.bustDart });
  const [frame, setFrame] = useState<Piece>();
  useEffect(() => {
    const before = last.current;
    last.current = { front, place: style.bustDart };
    const turns = before.place !== style.bustDart && !still;
    if (!turns || before.front === undefined || front === undefined || bustPoint === undefined) {
      setFrame(undefined);
      return undefined;
    }
    const from = before.front;
    const begun = performance.now();
    let waiting = 0;
    const draw = (now: number) => {
      const part = (now - begun) / whole;
      const next = part < 1 ? turningFront(from, front, bustPoint, Math.max(0, part)) : undefined;
      setFrame(next);
      if (next !== undefined) waiting = requestAnimationFrame(draw);
    };
    waiting = requestAnimationFrame(draw);
    return () => cancelAnimationFrame(waiting);
  }, [front, bustPoint, style.bustDart, still]);
  return frame ?? front;
}
