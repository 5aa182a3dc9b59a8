import type { Dispatch, ReactNode } from 'react';
import { Link } from 'react-router-dom';

import { Button } from '../../../ui/button.tsx';
import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { Wordmark } from '../../../ui/wordmark.tsx';
import type { Bench, BenchAction } from '../bench.ts';
import { UndoButtons } from './undo-buttons.tsx';

type TableHeaderProps = {
  readonly bench: Bench;
  readonly dispatch: Dispatch<BenchAction>;
  readonly onPrint: () => void;
  /** The way to the other places, where there are any. */
  readonly places?: ReactNode;
  /** Which gown lies here, where it has a name of its own. */
  readonly title?: ReactNode;
  /** How it is kept, and what else can be done with it. */
  readonly children: ReactNode;
};

/** Above the table: on a phone in two rows, the gown and its keeping in the second. */
export const TableHeader = (props: TableHeaderProps) => {
  const { bench, dispatch, onPrint, places, title, children } = props;
  const drawn = bench.table.drawn.draft !== undefined;
  return (
    <header className="flex shrink-0 flex-wrap items-center gap-x-2 border-b border-rule px-3 py-2 sm:gap-x-4 sm:px-4 lg:flex-nowrap">
      <Link to="/" aria-label="Ellwand, to the front page">
        <Wordmark compact={title !== undefined} />
      </Link>
      <h1 className="sr-only">Drafting table</h1>
      <div className="order-1 mr-auto min-w-0 grow basis-0 lg:order-2 lg:mr-0 lg:grow-0 lg:basis-auto">
        {title}
      </div>
      <span className="order-2 hidden sm:block lg:order-4">
        <ThemeToggle />
      </span>
      <span className="order-2 lg:order-4">
        <UnitChoice unit={bench.table.unit} onUnit={(unit) => dispatch({ type: 'unit', unit })} />
      </span>
      <Button kind="primary" className="order-2 lg:order-4" disabled={!drawn} onClick={onPrint}>
        Print
      </Button>
      <span className="order-3 basis-full lg:hidden" />
      {(places !== undefined || drawn) && (
        <nav aria-label="Places" className="order-4 flex gap-4 whitespace-nowrap lg:order-1">
          {places}
          {drawn && (
            <Link to="print" className="text-slate hover:text-ink max-sm:hidden">
              Print room
            </Link>
          )}
        </nav>
      )}
      <div className="order-4 flex min-w-0 grow items-center gap-x-2 lg:order-3 lg:gap-x-4">
        {children}
        <UndoButtons history={bench.history} dispatch={dispatch} />
      </div>
    </header>
  );
};
