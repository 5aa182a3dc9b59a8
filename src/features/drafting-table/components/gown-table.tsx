import { useMemo, useReducer, useState, type ReactNode } from 'react';
import { Link } from 'react-router-dom';

import type { Gown, GownContent } from '#shared/api/gowns.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';

import { useCalm } from '../../../lib/use-calm.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { bench, type Bench } from '../bench.ts';
import { choicesIn, choicesOf, contentOf, sameWork } from '../gown-content.ts';
import { readCurrentGown, sendGown } from '../gown-queries.ts';
import { lastDrawing, nothingDrawn } from '../drawn-table.ts';
import { closed, noHistory } from '../history.ts';
import type { DraftPlace } from '../kept-drafts.ts';
import type { Unsent } from '../saver.ts';
import { emptyTable, redrawn } from '../table-state.ts';
import { useSaver } from '../use-saver.ts';
import { CardTools } from './card-tools.tsx';
import { ConflictDialog } from './conflict-dialog.tsx';
import { workOf } from '../table-inputs.ts';
import { DraftingTable } from './drafting-table.tsx';
import { GownTitle } from './gown-title.tsx';
import { RevisionsSheet } from './revisions-sheet.tsx';
import { SaveState } from './save-state.tsx';

/** What a gown's table opens on. */
export type GownStart = {
  readonly bench: Bench;
  readonly title: string;
  readonly base: number;
  readonly changed: boolean;
  readonly unsent: Unsent<GownContent> | undefined;
};

type GownTableProps = {
  readonly gownId: string;
  readonly start: () => GownStart;
  readonly place: DraftPlace<GownContent>;
  readonly signIn: (onSignedIn: () => void) => ReactNode;
};

/** The drafting table of a gown that is kept: saved by itself, never overwritten without a word. */
export const GownTable = ({ gownId, start: opening, place, signIn }: GownTableProps) => {
  const [start] = useState(opening);
  const [state, dispatch] = useReducer(bench, start.bench);
  const [title, setTitle] = useState(start.title);
  const [open, setOpen] = useState<'revisions' | 'sign-in'>();
  const { table, history } = state;
  const { unit } = table;
  const { saver, saving, kept } = useSaver<GownContent, Gown>({
    ...start,
    engine: engineVersion,
    content: () => contentOf(table, unit),
    send: (save) => sendGown(gownId, save),
    readCurrent: readCurrentGown,
    same: sameWork,
    place,
    title,
    history: closed(history),
    work: [unit, ...workOf(table)],
  });

  /** Lays what the server has on the table; what lay there stays one step back. */
  const lay = ({ version, content }: Gown) => {
    const choices = choicesIn(content, unit);
    const laid = redrawn({ ...table, ...choices });
    saver.adopt(version, contentOf(laid, unit));
    dispatch({ type: 'work laid', work: choices });
  };
  const saveFirst = async () => {
    await saver.flush();
    return saver.now().base;
  };
  // Made anew where the work changed and not with every frame: it stands inside the measure card.
  const calm = useCalm(table, history.open?.gesture.startsWith('moved') === true);
  const cardTools = useMemo(() => <CardTools table={calm} dispatch={dispatch} />, [calm]);
  const { standing, message, current } = saving;
  const signedOut = standing === 'signed-out';
  return (
    <>
      <title>{`Ellwand · ${title}`}</title>
      <DraftingTable
        bench={state}
        dispatch={dispatch}
        place={gownId}
        cardTools={cardTools}
        places={
          <Link to="/gowns" className="text-slate hover:text-ink">
            Gowns
          </Link>
        }
        title={<GownTitle gownId={gownId} title={title} onNamed={setTitle} />}
        heading={
          <>
            <SaveState saving={saving} kept={kept} />
            {signedOut && (
              <Button kind="quiet" slim onClick={() => setOpen('sign-in')}>
                Sign in
              </Button>
            )}
            <Button kind="quiet" slim className="ml-auto" onClick={() => setOpen('revisions')}>
              Revisions
            </Button>
          </>
        }
        notice={
          standing === 'refused' && (
            <Notice>{`${message ?? ''} What you drew is kept here.`}</Notice>
          )
        }
      />
      {standing === 'conflict' && current !== undefined && (
        <ConflictDialog
          table={table}
          current={current}
          onMine={saver.keepMine}
          onTheirs={() => lay(current)}
        />
      )}
      {open === 'revisions' && standing !== 'conflict' && (
        <RevisionsSheet
          gownId={gownId}
          table={table}
          saveFirst={saveFirst}
          onClose={() => setOpen(undefined)}
          onReturned={(gown) => {
            lay(gown);
            setOpen(undefined);
          }}
        />
      )}
      <Dialog
        title="Sign in again"
        open={open === 'sign-in' && signedOut}
        onClose={() => setOpen(undefined)}
      >
        <p className="my-4">
          The session has ended. What you drew is kept in this browser and is saved once you are in.
        </p>
        {signIn(() => {
          setOpen(undefined);
          void saver.flush();
        })}
      </Dialog>
    </>
  );
};

/** A table to open on the content of a gown, over the last pieces that could be drawn of it. */
export const benchOf = (content: GownContent, drawn: Gown['drawn'] | undefined): Bench => {
  const { choices, unit } = choicesOf(content);
  const last = drawn ? lastDrawing(drawn.inputs) : nothingDrawn;
  return {
    table: redrawn({ ...emptyTable, ...choices, unit, drawn: last }),
    history: noHistory,
  };
};
