import type { Dispatch } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { TableAction } from '../table-state.ts';

/** Clears both cards to start anew; one step back brings them again. */
export const ClearCard = ({ dispatch }: { dispatch: Dispatch<TableAction> }) => (
  <Button kind="quiet" className="float-right -mr-4" onClick={() => dispatch({ type: 'cleared' })}>
    Clear the table
  </Button>
);
