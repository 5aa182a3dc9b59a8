import type { Dispatch } from 'react';
import { Link } from 'react-router-dom';

import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { Wordmark } from '../../../ui/wordmark.tsx';
import type { RoomAction } from '../room-choices.ts';
import type { Unit } from '#shared/units/said.ts';

type RoomHeaderProps = {
  /** Whose gown lies here. */
  readonly title: string;
  /** The address of its drafting table. */
  readonly table: string;
  readonly unit: Unit;
  readonly dispatch: Dispatch<RoomAction>;
};

/** Where this is, the way back to the table, and the reader's unit. */
export const RoomHeader = ({ title, table, unit, dispatch }: RoomHeaderProps) => (
  <header className="flex shrink-0 flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule px-3 py-2 sm:px-4">
    <Link to="/" aria-label="Ellwand, to the front page">
      <Wordmark compact />
    </Link>
    <h1 className="font-semibold">Print room</h1>
    <p className="min-w-0 truncate text-slate max-sm:order-4">{title}</p>
    <nav aria-label="Places" className="max-sm:order-4 max-sm:ml-auto">
      <Link to={table} className="text-brass underline underline-offset-4">
        To the table
      </Link>
    </nav>
    <span className="order-3 hidden basis-full max-sm:block" />
    <span className="ml-auto flex items-center gap-2">
      <ThemeToggle className="max-sm:hidden" />
      <UnitChoice unit={unit} onUnit={(chosen) => dispatch({ type: 'unit', unit: chosen })} />
    </span>
  </header>
);
