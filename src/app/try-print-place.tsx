import { useState } from 'react';

import { readersTable } from '../features/drafting-table/saved-table.ts';
import { PrintRoomPage } from '../features/print-room/routes/print-room-page.tsx';
import { paths } from './paths.ts';

/** The print room for what lies on the table at Try it. */
export const TryPrintPlace = () => {
  const [table] = useState(readersTable);
  const { drawn, name, unit } = table;
  return (
    <PrintRoomPage
      draft={drawn.draft}
      fresh={drawn.fresh}
      title={name === '' ? 'A gown to try' : `${name} · gown`}
      unit={unit}
      table={paths.table}
      maker="try"
    />
  );
};
