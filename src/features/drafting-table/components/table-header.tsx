import type { Dispatch } from 'react';
import { Link } from 'react-router-dom';

import { Button } from '../../../ui/button.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import { Wordmark } from '../../../ui/wordmark.tsx';
import type { TableAction, TableState } from '../table-state.ts';

type TableHeaderProps = {
  readonly state: TableState;
  readonly kept: boolean;
  readonly dispatch: Dispatch<TableAction>;
  readonly onPrint: () => void;
};

export const TableHeader = ({ state, kept, dispatch, onPrint }: TableHeaderProps) => (
  <header className="flex shrink-0 items-center gap-2 border-b border-rule px-3 py-2 sm:gap-4 sm:px-4">
    <Link to="/" aria-label="Ellwand, to the front page">
      <Wordmark />
    </Link>
    <h1 className="sr-only">Drafting table</h1>
    <p className="ml-auto hidden truncate md:block">
      {state.name === '' ? 'A gown to try' : `${state.name} · gown`}
    </p>
    <p className={`hidden shrink-0 text-sm lg:block ${kept ? 'text-verdigris' : 'text-madder'}`}>
      {kept ? '✓ kept in this browser' : 'This browser keeps nothing: print before you leave'}
    </p>
    <span className="hidden sm:block">
      <ThemeToggle className="px-2" />
    </span>
    <span className="ml-auto md:ml-0">
      <Segmented
        legend="Unit"
        choices={[
          { value: 'in', label: 'inch' },
          { value: 'cm', label: 'cm' },
        ]}
        value={state.unit}
        onChoose={(unit) => dispatch({ type: 'unit', unit })}
      />
    </span>
    <Button
      kind="primary"
      className="px-3 sm:px-4"
      disabled={state.drawn.draft === undefined}
      onClick={onPrint}
    >
      Print
    </Button>
  </header>
);
