import { useState } from 'react';

import { keptTable } from '../features/drafting-table/saved-table.ts';
import { TryReplayPage } from '../features/replay/routes/try-replay-page.tsx';
import { measuresInInches } from '../lib/reader.ts';

/** The replay of what lies on the table at Try it. */
export const TryReplayPlace = () => {
  const [{ drawn, unit }] = useState(() => keptTable(measuresInInches() ? 'in' : 'cm'));
  return <TryReplayPage draft={drawn.draft} unit={unit} />;
};
