import { useEffect, useRef, useState, type Dispatch } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { BenchAction } from '../bench.ts';
import type { TableState } from '../table-state.ts';

type ClearCardProps = {
  readonly what: string;
  readonly state: TableState;
  readonly dispatch: Dispatch<BenchAction>;
};

/** Clears what lies here to start anew, and says whose figures went and how they come back. */
export const ClearCard = ({ what, state, dispatch }: ClearCardProps) => {
  const [gone, setGone] = useState<string>();
  const message = useRef<HTMLParagraphElement>(null);
  useEffect(() => {
    if (gone !== undefined) message.current?.scrollIntoView({ block: 'nearest' });
  }, [gone]);
  const empty = Object.keys(state.entries).length === 0 && state.name === '';
  return (
    <>
      <Button
        kind="quiet"
        slim
        className="float-right -mr-2 min-h-10"
        onClick={() => {
          if (empty) return;
          setGone(state.name.trim() === '' ? 'The figures' : `${state.name.trim()}’s figures`);
          dispatch({ type: 'cleared' });
        }}
      >
        {`Clear the ${what}`}
      </Button>
      <p ref={message} role="status" className="clear-both scroll-mb-4 text-sm">
        {empty && gone !== undefined && (
          <>
            {`${gone} are cleared. `}
            <Button kind="quiet" slim onClick={() => dispatch({ type: 'undo' })}>
              Bring them back
            </Button>
          </>
        )}
      </p>
    </>
  );
};
