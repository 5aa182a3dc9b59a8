import type { Dispatch, ReactNode } from 'react';
import { Link } from 'react-router-dom';

import { Button } from '../../../ui/button.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import { Wordmark } from '../../../ui/wordmark.tsx';
import type { Bench, BenchAction } from '../bench.ts';
import { UndoButtons } from './undo-buttons.tsx';

type TableHeaderProps = {
  readonly bench: Bench;
  readonly dispatch: Dispatch<BenchAction>;
  readonly onPrint: () => void;
  /** Which gown lies here, how it is kept, and what else can be done with it. */
  readonly children: ReactNode;
};

/** Above the table: on a phone in two rows, the gown and its keeping in the second. */
export const TableHeader = ({ bench, dispatch, onPrint, children }: TableHeaderProps) => (
  <header className="flex shrink-0 flex-wrap items-center gap-x-2 border-b border-rule px-3 py-2 sm:gap-x-4 sm:px-4 lg:flex-nowrap">
    <Link to="/" aria-label="Ellwand, to the front page">
      <Wordmark />
    </Link>
    <h1 className="sr-only">Drafting table</h1>
    <div className="order-last flex min-w-0 basis-full items-center gap-x-3 pt-1 lg:order-none lg:grow lg:basis-0 lg:pt-0">
      {children}
      <UndoButtons history={bench.history} dispatch={dispatch} />
    </div>
    <span className="ml-auto hidden sm:block">
      <ThemeToggle className="px-2" />
    </span>
    <span className="ml-auto sm:ml-0">
      <Segmented
        legend="Unit"
        choices={[
          { value: 'in', label: 'inch' },
          { value: 'cm', label: 'cm' },
        ]}
        value={bench.table.unit}
        onChoose={(unit) => dispatch({ type: 'unit', unit })}
      />
    </span>
    <Button
      kind="primary"
      className="px-3 sm:px-4"
      disabled={bench.table.drawn.draft === undefined}
      onClick={onPrint}
    >
      Print
    </Button>
  </header>
);
