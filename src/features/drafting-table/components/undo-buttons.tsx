import type { Dispatch } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { BenchAction } from '../bench.ts';
import type { History } from '../history.ts';
import { changeWords } from '../part-words.ts';

type UndoButtonsProps = {
  readonly history: History;
  readonly dispatch: Dispatch<BenchAction>;
};

/** One step back, one step on; each says what it would change. */
export const UndoButtons = ({ history, dispatch }: UndoButtonsProps) => {
  const last = history.past.at(-1);
  const next = history.future[0];
  const words = (verb: string, change: typeof last) =>
    change === undefined ? `${verb}: nothing to do` : `${verb} ${changeWords(change)}`;
  return (
    <span className="flex" role="group" aria-label="Step back and on">
      <Button
        kind="quiet"
        slim
        disabled={last === undefined}
        aria-label={words('Undo', last)}
        title={words('Undo', last)}
        onClick={() => dispatch({ type: 'undo' })}
      >
        Undo
      </Button>
      <Button
        kind="quiet"
        slim
        disabled={next === undefined}
        aria-label={words('Redo', next)}
        title={words('Redo', next)}
        onClick={() => dispatch({ type: 'redo' })}
      >
        Redo
      </Button>
      <span role="status" className="sr-only">
        {next === undefined ? '' : `Taken back: ${changeWords(next)}`}
      </span>
    </span>
  );
};
