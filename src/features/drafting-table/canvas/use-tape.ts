import { useState } from 'react';

import type { Point } from '#shared/geometry/point.ts';
import { formatWithUnit } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

import type { Layout } from './layout.ts';
import { tapeCorners, tapePlace, tapeReading, type TapePlace } from './tape.ts';

/** What the tape reads, in the reader's unit. */
export function readingWords(from: TapePlace, to: TapePlace, unit: Unit): string {
  const { straight, along } = tapeReading(from, to);
  const direct = formatWithUnit(straight, unit);
  if (along === undefined) return direct;
  const seam = formatWithUnit(along.length, unit);
  return seam === direct ? `${seam} along the seam` : `${seam} along the seam, ${direct} straight`;
}

/** The measuring tape: where its ends are held, and where the next one would be. */
export function useTape(layout: Layout) {
  const [ends, setEnds] = useState<readonly TapePlace[]>([]);
  const [cursor, setCursor] = useState<TapePlace>();
  const corners = () => tapeCorners(layout);
  const hold = (place: TapePlace | undefined) => {
    if (place === undefined) return;
    setCursor(place);
    setEnds((now) => (now.length === 1 ? [...now, place] : [place]));
  };
  return {
    ends,
    cursor,
    /** Holds the tape to what lies at a place of the paper; a third place begins anew. */
    hold: (at: Point, reach: number) => hold(tapePlace(layout, at, reach)),
    holdHere: () => hold(cursor ?? corners()[0]),
    follow: (at: Point, reach: number) => setCursor(tapePlace(layout, at, reach)),
    /** On to the next corner of the pieces, or back to the one before. */
    walk: (by: number) => {
      const all = corners();
      const now = all.findIndex(({ words }) => words !== undefined && words === cursor?.words);
      setCursor(all[(Math.max(now, by < 0 ? 0 : -1) + by + all.length) % all.length]);
    },
    step: (by: Point, reach: number) => {
      const from = cursor?.at ?? corners()[0]?.at ?? { x: 0, y: 0 };
      const caught = tapePlace(layout, { x: from.x + by.x, y: from.y + by.y }, reach);
      const stuck = caught.at.x === from.x && caught.at.y === from.y;
      setCursor(stuck ? { at: { x: from.x + by.x, y: from.y + by.y }, on: [] } : caught);
    },
    clear: () => {
      setEnds([]);
      setCursor(undefined);
    },
  };
}
