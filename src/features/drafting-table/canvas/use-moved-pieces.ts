import { useEffect, useMemo, useState } from 'react';

import { add, point, type Point } from '#shared/geometry/point.ts';

import { browserStorage } from '../../../lib/browser-storage.ts';
import { isRecord } from '../is-record.ts';
import type { Layout } from './layout.ts';
import { shifted, type Shifts } from './moved-pieces.ts';

/** The pieces where the maker has moved them on this table, remembered in this browser. */
export function useMovedPieces(place: string, layout: Layout, movable: boolean) {
  const key = `ellwand.places.${place}`;
  const [shifts, setShifts] = useState<Shifts>(() => keptShifts(key));
  const moved = useMemo(
    () => (movable ? shifted(layout, shifts) : layout),
    [movable, layout, shifts],
  );
  useEffect(() => {
    try {
      if (Object.keys(shifts).length === 0) browserStorage('local')?.removeItem(key);
      else browserStorage('local')?.setItem(key, JSON.stringify(shifts));
    } catch {
      // Where nothing is kept the pieces lie as they were cut the next time.
    }
  }, [key, shifts]);
  return {
    layout: moved,
    shifts,
    any: Object.keys(shifts).length > 0,
    move: (piece: string, by: Point) =>
      setShifts((now) => ({ ...now, [piece]: add(now[piece] ?? point(0, 0), by) })),
    /** Lays one piece, or all of them, where they lay. */
    snapBack: (piece?: string) =>
      setShifts((now) =>
        Object.fromEntries(
          Object.entries(now).filter(([name]) => piece !== undefined && name !== piece),
        ),
      ),
  };
}

function keptShifts(key: string): Shifts {
  try {
    const kept: unknown = JSON.parse(browserStorage('local')?.getItem(key) ?? '{}');
    if (!isRecord(kept)) return {};
    return Object.fromEntries(
      Object.entries(kept).flatMap(([piece, by]) =>
        isRecord(by) && typeof by['x'] === 'number' && typeof by['y'] === 'number'
          ? [[piece, point(by['x'], by['y'])]]
          : [],
      ),
    );
  } catch {
    return {};
  }
}
