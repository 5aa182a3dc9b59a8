import { useEffect, useState } from 'react';

import { nearest, type WayOut } from './nearest.ts';
import type { TableState } from './table-state.ts';

/** A refusal has stood for so long before a way out is looked for, ms: each that is tried is drawn. */
const patience = 300;

/** The nearest gown that can be drawn, once what cannot has stood for a moment. */
export function useNearest(state: TableState): WayOut | undefined {
  const [found, setFound] = useState<{ readonly of: unknown; readonly way: WayOut | undefined }>();
  const { problems, fresh } = state.drawn;
  useEffect(() => {
    if (fresh) return;
    const timer = setTimeout(() => setFound({ of: problems, way: nearest(state) }), patience);
    return () => clearTimeout(timer);
  }, [state, problems, fresh]);
  return !fresh && found?.of === problems ? found.way : undefined;
}
