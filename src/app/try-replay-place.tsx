import { useState } from 'react';

import { readersTable } from '../features/drafting-table/saved-table.ts';
import { TryReplayPage } from '../features/replay/routes/try-replay-page.tsx';

/** The replay of what lies on the table at Try it. */
export const TryReplayPlace = () => {
  const [{ drawn, unit }] = useState(readersTable);
  return <TryReplayPage draft={drawn.draft} unit={unit} />;
};
