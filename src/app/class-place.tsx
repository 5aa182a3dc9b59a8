import { useState } from 'react';

import { keptTable } from '../features/drafting-table/saved-table.ts';
import { ClassPage } from '../features/replay/routes/class-page.tsx';

/** A class, whose learner may take the card that lies on this browser's own table. */
export const ClassPlace = () => {
  const [{ drawn }] = useState(() => keptTable('cm'));
  return <ClassPage onTable={drawn.draft?.inputs.card} />;
};
