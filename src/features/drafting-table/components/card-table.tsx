import { useReducer, useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';

import type { CardContent, KeptCard } from '#shared/api/measure-cards.ts';

import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { FullSheet } from '../../../ui/full-sheet.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { bench } from '../bench.ts';
import { cardChoices, cardContentOf, sameCard } from '../card-content.ts';
import { readCurrentCard, sendCard } from '../card-queries.ts';
import { closed, keptHistory, noHistory } from '../history.ts';
import type { DraftPlace } from '../kept-drafts.ts';
import { emptyTable, redrawn } from '../table-state.ts';
import { useSaver } from '../use-saver.ts';
import { useUndoKeys } from '../use-undo-keys.ts';
import { MeasureCard } from './measure-card.tsx';
import { SaveState } from './save-state.tsx';
import { SideBySide } from './side-by-side.tsx';
import { UndoButtons } from './undo-buttons.tsx';

type CardTableProps = {
  readonly cardId: string;
  readonly card: KeptCard | undefined;
  readonly place: DraftPlace<CardContent>;
  readonly signIn: (onSignedIn: () => void) => ReactNode;
};

/** A measure card by itself: filled in as on the drafting table, saved by itself as it is. */
export const CardTable = ({ cardId, card, place, signIn }: CardTableProps) => {
  const [start] = useState(() => startOf(card, place));
  const [state, dispatch] = useReducer(bench, start.bench);
  const [signing, setSigning] = useState(false);
  useUndoKeys(dispatch);
  const { table, history } = state;
  const { name, date, overruled, entries, unit } = table;
  const { saver, saving, kept } = useSaver<CardContent, KeptCard>({
    ...start,
    engine: '',
    content: () => cardContentOf(table, unit),
    send: (save) => sendCard(cardId, save),
    readCurrent: readCurrentCard,
    same: (a, b) => sameCard(table, a, b),
    place,
    history: closed(history),
    work: [name, date, overruled, entries, unit],
  });
  const { standing, message, current } = saving;
  const takeTheirs = ({ version, content }: KeptCard) => {
    const work = cardChoices(table, content);
    saver.adopt(version, cardContentOf(work, unit));
    dispatch({ type: 'work laid', work });
  };
  return (
    <div className="flex min-h-dvh flex-col">
      <title>{`Ellwand · ${start.title}`}</title>
      <header className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule px-4 py-2">
        <Link to="/gowns/measure-cards" className="text-brass underline underline-offset-4">
          Measure cards
        </Link>
        <h1 className="min-w-0 truncate font-semibold">{start.title}</h1>
        <SaveState saving={saving} kept={kept} />
        {standing === 'signed-out' && (
          <Button kind="quiet" slim onClick={() => setSigning(true)}>
            Sign in
          </Button>
        )}
        <span className="ml-auto flex items-center gap-3">
          <UndoButtons history={history} dispatch={dispatch} />
          <UnitChoice unit={unit} onUnit={(to) => dispatch({ type: 'unit', unit: to })} />
        </span>
      </header>
      {standing === 'refused' && <Notice>{`${message ?? ''} What you typed is kept here.`}</Notice>}
      <main id="content" className="mx-auto w-full max-w-xl grow bg-cloth px-4 py-4">
        <MeasureCard alone state={table} dispatch={dispatch} />
      </main>
      {standing === 'conflict' && current !== undefined && (
        <FullSheet
          title="This card was saved elsewhere meanwhile"
          help="Look at both and choose one; yours stays one step back if you take the saved one."
          actions={
            <>
              <Button kind="primary" onClick={saver.keepMine}>
                Keep mine
              </Button>
              <Button onClick={() => takeTheirs(current)}>Take the saved one</Button>
            </>
          }
        >
          <SideBySide
            unit={unit}
            left={{ title: 'Mine', note: 'on this page, not saved yet', work: table }}
            right={{
              title: 'Saved',
              note: `from ${current.lastSave.device}, ${momentWords(current.lastSave.savedAt)}`,
              work: cardChoices(table, current.content),
            }}
          />
        </FullSheet>
      )}
      <Dialog
        title="Sign in again"
        open={signing && standing === 'signed-out'}
        onClose={() => setSigning(false)}
      >
        <p className="my-4">The session has ended. What you typed is kept in this browser.</p>
        {signIn(() => {
          setSigning(false);
          void saver.flush();
        })}
      </Dialog>
    </div>
  );
};

/** What this browser has not sent yet goes before what the server has. */
function startOf(card: KeptCard | undefined, { found }: DraftPlace<CardContent>) {
  const own =
    found !== undefined && (card === undefined || found.changed || found.base === card.version);
  const content = own ? found.content : card?.content;
  if (content === undefined) throw new Error('there is neither a card nor a draft of one');
  const { unit } = content.typed;
  const table = redrawn({ ...emptyTable, unit, ...cardChoices({ ...emptyTable, unit }, content) });
  return {
    bench: { table, history: own ? keptHistory(found.history, table, unit) : noHistory },
    title: card?.name ?? found?.title ?? 'Measure card',
    base: own ? found.base : (card?.version ?? 1),
    changed: own && found.changed,
    unsent: own ? found.unsent : undefined,
  };
}
