import { useMemo, useState } from 'react';

import type { Point } from '#shared/geometry/point.ts';

import { fitted, panned, zoomed, type Box, type Place, type Size, type View } from './view.ts';

type Framing = { readonly key: string } & (
  { readonly box: Box; readonly place: Place } | { readonly view: View }
);

/**
 * How the drawing is looked at: a box that stays fitted as the window changes, until the reader moves
 * or zooms by hand. A new set of pieces, or pieces of quite another size, is fitted again.
 */
export function useFraming(key: string, box: Box, size: Size) {
  const [framing, setFraming] = useState<Framing>({ key, box, place: 'corner' });
  const outgrown = 'place' in framing && framing.place === 'corner' && outgrows(box, framing.box);
  if (framing.key !== key || outgrown) setFraming({ key, box, place: 'corner' });
  const view = useMemo(() => seen(framing, size), [framing, size]);
  return {
    view,
    fit: (to: Box, place: Place) => setFraming({ key, box: to, place }),
    pan: (by: Point) => setFraming((now) => ({ key, view: panned(seen(now, size), by) })),
    zoom: (by: number, at: Point) =>
      setFraming((now) => ({ key, view: zoomed(seen(now, size), by, at) })),
  };
}

const seen = (framing: Framing, size: Size): View =>
  'view' in framing ? framing.view : fitted(framing.box, size, framing.place);

/** Whether pieces have grown out of the fitted box, or shrunk so far that it no longer frames them. */
function outgrows(now: Box, framed: Box): boolean {
  const size = Math.max(framed.right - framed.left, framed.bottom - framed.top, 1);
  const grown = [
    framed.left - now.left,
    now.right - framed.right,
    framed.top - now.top,
    now.bottom - framed.bottom,
  ];
  return grown.some((by) => by > 0.01 * size || by < -0.08 * size);
}
