import {
  useCallback,
  useDeferredValue,
  useRef,
  useState,
  type Dispatch,
  type ReactNode,
} from 'react';

import { useCalm } from '../../../lib/use-calm.ts';
import { coreMeasures } from '#shared/body/card.ts';

import { useMedia } from '../../../lib/use-media.ts';
import { Tabs, type Tab } from '../../../ui/tabs.tsx';
import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import type { Bench, BenchAction } from '../bench.ts';
import type { Panel } from '../table-state.ts';
import { useUndoKeys } from '../use-undo-keys.ts';
import { Drawing } from './drawing.tsx';
import { EmptyTable } from './empty-table.tsx';
import { Foot } from './foot.tsx';
import { MeasureCard } from './measure-card.tsx';
import { PiecesPanel } from './pieces-panel.tsx';
import { PrintDialog } from './print-dialog.tsx';
import { ProofPanel } from './proof-panel.tsx';
import { StepsPanel } from './steps-panel.tsx';
import { StyleCard } from './style-card.tsx';
import { TableHeader } from './table-header.tsx';

type DraftingTableProps = {
  readonly bench: Bench;
  readonly dispatch: Dispatch<BenchAction>;
  /** Under what the places of moved pieces are kept in this browser. */
  readonly place: string;
  /** For the header: the other places, the gown's name, and how it is kept. */
  readonly places?: ReactNode;
  readonly title?: ReactNode;
  readonly heading: ReactNode;
  /** Something that needs doing before all else. */
  readonly notice?: ReactNode;
  /** What else can be done with the measure card. */
  readonly cardTools?: ReactNode;
};

/** The drafting table: cards, drawing and panels, all of one state. */
export const DraftingTable = (props: DraftingTableProps) => {
  const { bench, dispatch, place, places, title, heading, notice, cardTools } = props;
  const { table: state } = bench;
  const [printing, setPrinting] = useState(false);
  const cards = useRef<HTMLDivElement>(null);
  const wide = useMedia('(min-width: 1100px)');
  const print = useCallback(() => setPrinting(true), []);
  const content = useRef<HTMLDivElement>(null);
  const filled = useCallback(
    () => requestAnimationFrame(() => placeAfterCard(cards.current, content.current)?.focus()),
    [],
  );
  useUndoKeys(dispatch);

  const { draft } = state.drawn;
  // The drawing follows at once; cards, tables and sentences follow when the hand on a handle rests.
  const dragging = bench.history.open?.gesture.startsWith('moved') === true;
  const calm = useCalm(state, dragging);
  const told = useDeferredValue(calm.drawn.draft);
  const waiting = <p className="text-slate">Here as soon as the ten measures are in.</p>;

  const measures: Tab<Panel> = {
    value: 'measures',
    label: 'Measures',
    render: () => (
      <MeasureCard state={calm} dispatch={dispatch} tools={cardTools} onFilled={filled} />
    ),
  };
  const style: Tab<Panel> = {
    value: 'style',
    label: 'Style',
    render: () => (
      <>
        <StyleCard state={calm} dispatch={dispatch} />
        <p className="flex items-center gap-2 pt-4 sm:hidden">
          Look of the page
          <ThemeToggle />
        </p>
      </>
    ),
  };
  const panels: readonly Tab<Panel>[] = [
    {
      value: 'steps',
      label: 'Steps',
      render: () =>
        told === undefined ? (
          waiting
        ) : (
          <StepsPanel
            draft={told}
            chosen={calm.step}
            unit={calm.unit}
            dispatch={dispatch}
            replay={place === 'try' ? '/try/replay' : `/gowns/${place}/replay`}
          />
        ),
    },
    {
      value: 'proof',
      label: 'Proof',
      render: () =>
        told === undefined ? (
          waiting
        ) : (
          <ProofPanel
            draft={told}
            fresh={state.drawn.fresh}
            lit={state.seam}
            unit={state.unit}
            dispatch={dispatch}
          />
        ),
    },
    {
      value: 'pieces',
      label: 'Pieces',
      render: () => (told === undefined ? waiting : <PiecesPanel draft={told} unit={calm.unit} />),
    },
  ];
  const besides = panels.some(({ value }) => value === state.panel) ? state.panel : 'proof';
  const choose = (panel: Panel) => dispatch({ type: 'panel', panel });

  const drawing = (
    <div className="flex min-h-0 min-w-0 grow flex-col" id="content" ref={content}>
      {draft === undefined ? (
        <EmptyTable
          state={state}
          dispatch={dispatch}
          onType={() => {
            choose('measures');
            requestAnimationFrame(() =>
              cards.current?.querySelector<HTMLInputElement>('input[name="card.name"]')?.focus(),
            );
          }}
        />
      ) : (
        <>
          <Drawing draft={draft} state={state} place={place} dispatch={dispatch} onPrint={print} />
          <Foot draft={calm.drawn.draft ?? draft} state={calm} dispatch={dispatch} />
        </>
      )}
    </div>
  );

  return (
    <div className="flex h-dvh flex-col overflow-hidden">
      <TableHeader bench={bench} dispatch={dispatch} places={places} title={title} onPrint={print}>
        {heading}
      </TableHeader>
      {notice}
      {wide ? (
        <main className="flex min-h-0 grow">
          <div
            ref={cards}
            className="w-[19rem] shrink-0 space-y-8 overflow-y-auto border-r border-rule bg-cloth px-4 py-4"
          >
            <MeasureCard state={calm} dispatch={dispatch} tools={cardTools} onFilled={filled} />
            <StyleCard state={calm} dispatch={dispatch} />
          </div>
          {drawing}
          <div className="w-[21rem] shrink-0 border-l border-rule bg-cloth px-4 pt-4">
            <Tabs label="About the draft" tabs={panels} value={besides} onChoose={choose} />
          </div>
        </main>
      ) : (
        <main className="flex min-h-0 grow flex-col sm:landscape:flex-row">
          {drawing}
          <div
            ref={cards}
            className="h-[46dvh] shrink-0 border-t border-rule bg-cloth px-3 pt-2 sm:landscape:h-auto sm:landscape:w-[22rem] sm:landscape:border-t-0 sm:landscape:border-l"
          >
            <Tabs
              label="Cards and panels"
              tabs={[measures, style, ...panels]}
              value={state.panel}
              onChoose={choose}
            />
          </div>
        </main>
      )}
      {draft !== undefined && (
        <PrintDialog
          draft={draft}
          state={state}
          open={printing}
          onClose={() => setPrinting(false)}
        />
      )}
    </div>
  );
};

/** Where the hand goes after the last measure: to what is wrong, to what is still open, or to the drawing. */
const placeAfterCard = (cards: HTMLElement | null, content: HTMLElement | null) => {
  const fields = [...(cards?.querySelectorAll<HTMLInputElement>('input[name^="card."]') ?? [])];
  const core = fields.filter(({ name }) => coreMeasures.some((key) => name === `card.${key}`));
  return (
    fields.find((field) => field.getAttribute('aria-invalid') === 'true') ??
    core.find(({ value }) => value === '') ??
    content?.querySelector<HTMLElement>('[role=group][tabindex]')
  );
};
