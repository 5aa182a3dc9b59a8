import { useEffect, useState } from 'react';
import type { z } from 'zod';

import { takeDraftPlace, type DraftPlace } from './kept-drafts.ts';

/** This tab's place for a record in the browser, let go of when its page is left; none while it is taken. */
export function useDraftPlace<C>(
  kind: 'gown' | 'card',
  id: string,
  content: z.ZodType<C>,
): DraftPlace<C> | undefined {
  const [place, setPlace] = useState<DraftPlace<C>>();
  useEffect(() => {
    const taking = takeDraftPlace(kind, id, content);
    void taking.then(setPlace);
    return () => void taking.then(({ letGo }) => letGo());
  }, [kind, id, content]);
  return place;
}
