import { useEffect, useMemo, useReducer, useState } from 'react';

import type { Drafted } from '#shared/engine/drafted.ts';
import { leavingOut } from '#shared/sheets/sheet-plan.ts';
import { printedTiles } from '#shared/sheets/tile-plan.ts';
import type { Unit } from '#shared/units/said.ts';

import { useMedia } from '../../../lib/use-media.ts';
import { Tabs, type Tab } from '../../../ui/tabs.tsx';
import { keepChoices, keptChoices } from '../kept-choices.ts';
import { orderOf } from '../order-of.ts';
import { roomChoices } from '../room-choices.ts';
import { planKey, usePlan } from '../../../lib/use-plan.ts';
import { useSheetsFiles } from '../use-sheets-files.ts';
import { BeforeCutting } from './before-cutting.tsx';
import { LinesCard } from './lines-card.tsx';
import { PagePlan } from './page-plan.tsx';
import { PaperCard } from './paper-card.tsx';
import { PiecesCard } from './pieces-card.tsx';
import { PlanCount } from './plan-count.tsx';
import { FileStates, PrintBar } from './print-bar.tsx';
import { RoomHeader } from './room-header.tsx';
import { ScaleCheckCard } from './scale-check-card.tsx';

/** What is brought from a table to be printed. */
export type ToPrint = {
  readonly draft: Drafted;
  /** Whether the draft is that of the figures on the table. */
  readonly fresh: boolean;
  readonly title: string;
  /** The unit the table is read in. */
  readonly unit: Unit;
  /** The address of the table. */
  readonly table: string;
  /** Whose habits are remembered here. */
  readonly maker: string;
};

/** No sheet is left out. */
const none: readonly string[] = [];

type CardName = 'paper' | 'pieces' | 'lines' | 'scale' | 'cutting';

/** The print room: what is printed and on what, the page plan of it, and the file. */
export const PrintRoom = ({ draft, fresh, title, table, maker, unit: tableUnit }: ToPrint) => {
  const { pieces, number, proof } = draft;
  const place = useMemo(() => ({ maker, place: table }), [maker, table]);
  const [room, dispatch] = useReducer(roomChoices, undefined, () => keptChoices(place, tableUnit));
  const [card, setCard] = useState<CardName>('paper');
  const wide = useMedia('(min-width: 1100px)');
  useEffect(() => keepChoices(place, room), [place, room]);

  const asked = useMemo(() => orderOf(room, pieces), [room, pieces]);
  const order = 'order' in asked ? asked.order : undefined;
  const problems = 'problems' in asked ? asked.problems : [];
  const { planning, last, cancel, again } = usePlan(pieces, number, order);
  const key = order && planKey(number, order);
  const leftOut = room.leftOut.plan === key ? room.leftOut.names : none;
  const planned = planning.kind === 'planned' && planning.key === key;
  const shown = useMemo(() => last && leavingOut(last, leftOut), [last, leftOut]);
  const everyOut = planned && shown !== undefined && printedTiles(shown.plan).length === 0;
  const { unit } = room;
  const files = useSheetsFiles(draft, unit);

  const scaleCheck = <ScaleCheckCard room={room} paper={order?.paper} dispatch={dispatch} />;
  const cards: readonly Tab<CardName>[] = [
    {
      value: 'paper',
      label: 'Paper',
      render: () => <PaperCard room={room} problems={problems} dispatch={dispatch} />,
    },
    {
      value: 'pieces',
      label: 'Pieces',
      render: () => (
        <PiecesCard room={room} problems={problems} pieces={pieces} dispatch={dispatch} />
      ),
    },
    { value: 'lines', label: 'Lines', render: () => <LinesCard room={room} dispatch={dispatch} /> },
    { value: 'scale', label: 'Scale', render: () => scaleCheck },
    { value: 'cutting', label: 'Cutting', render: () => <BeforeCutting /> },
  ];

  const plan = (
    <div id="content" className="flex min-h-0 min-w-0 grow flex-col">
      <div className="shrink-0 px-3 py-2 sm:px-4">
        <div className="flex items-start gap-x-3">
          <PlanCount
            planning={planning}
            plan={shown}
            unit={unit}
            onCancel={cancel}
            onAgain={again}
          />
          <PrintBar
            files={files}
            order={planned && order && !everyOut ? { ...order, leftOut } : undefined}
          />
        </div>
        <FileStates files={files} unit={unit} />
        {!fresh && (
          <p className="text-madder">
            The figures on the table cannot be drawn: this prints the last good draft.
          </p>
        )}
        {!proof.holds && (
          <p className="font-semibold text-madder">
            These pieces do not yet sew together: see Proof at the table before you cut.
          </p>
        )}
        {everyOut && <p className="text-madder">Every sheet is left out: take one back.</p>}
      </div>
      {shown === undefined ? (
        <div className="grow bg-cloth" />
      ) : (
        <PagePlan
          plan={shown}
          pieces={pieces}
          unit={unit}
          passing={!planned}
          onSheet={(name) => key !== undefined && dispatch({ type: 'sheet', plan: key, name })}
        />
      )}
      <p className="shrink-0 px-3 py-1 text-sm text-slate sm:px-4">
        Click a sheet to leave it out or take it back.
      </p>
    </div>
  );

  return (
    <div className="flex h-dvh flex-col overflow-hidden">
      <title>{`Ellwand · print room · ${title}`}</title>
      <RoomHeader title={title} table={table} unit={unit} dispatch={dispatch} />
      {wide ? (
        <main className="flex min-h-0 grow">
          <div className="w-[21rem] shrink-0 space-y-8 overflow-y-auto border-r border-rule bg-cloth px-4 py-4">
            {cards.slice(0, 3).map(({ value, render }) => (
              <div key={value}>{render()}</div>
            ))}
          </div>
          {plan}
          <div className="w-[19rem] shrink-0 space-y-8 overflow-y-auto border-l border-rule bg-cloth px-4 py-4">
            {scaleCheck}
            <BeforeCutting />
          </div>
        </main>
      ) : (
        <main className="flex min-h-0 grow flex-col sm:landscape:flex-row">
          {plan}
          <div className="h-[40dvh] shrink-0 border-t border-rule bg-cloth px-3 pt-2 sm:landscape:h-auto sm:landscape:w-[22rem] sm:landscape:border-t-0 sm:landscape:border-l">
            <Tabs label="What is printed" tabs={cards} value={card} onChoose={setCard} />
          </div>
        </main>
      )}
    </div>
  );
};
