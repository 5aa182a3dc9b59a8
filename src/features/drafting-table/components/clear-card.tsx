import { useState, type Dispatch } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { TableAction } from '../table-state.ts';

/** Clears both cards to start anew; asks once more, as there is no way back yet. */
export const ClearCard = ({ dispatch }: { dispatch: Dispatch<TableAction> }) => {
  const [asked, setAsked] = useState(false);
  if (!asked) {
    return (
      <Button kind="quiet" className="float-right -mr-4" onClick={() => setAsked(true)}>
        Clear the table
      </Button>
    );
  }
  return (
    <div className="flex flex-wrap items-center justify-between gap-2 py-2" role="group">
      <p className="basis-full text-sm">All figures on both cards go.</p>
      <Button
        onClick={() => {
          setAsked(false);
          dispatch({ type: 'cleared' });
        }}
      >
        Clear
      </Button>
      <Button kind="quiet" onClick={() => setAsked(false)}>
        Keep them
      </Button>
    </div>
  );
};
