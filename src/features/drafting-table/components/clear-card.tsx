import type { Dispatch } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { TableAction } from '../table-state.ts';

type ClearCardProps = { readonly what: string; readonly dispatch: Dispatch<TableAction> };

/** Clears what lies here to start anew; one step back brings it again. */
export const ClearCard = ({ what, dispatch }: ClearCardProps) => (
  <Button kind="quiet" className="float-right -mr-4" onClick={() => dispatch({ type: 'cleared' })}>
    {`Clear the ${what}`}
  </Button>
);
