import type { Gown } from '#shared/api/gowns.ts';

import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { choicesOf } from '../gown-content.ts';
import type { TableState } from '../table-state.ts';
import { FullSheet } from '../../../ui/full-sheet.tsx';
import { SideBySide } from './side-by-side.tsx';

type ConflictDialogProps = {
  readonly table: TableState;
  readonly current: Gown;
  readonly onMine: () => void;
  readonly onTheirs: () => void;
};

/** The gown was saved meanwhile from somewhere else: both states, and a choice between them. */
export const ConflictDialog = ({ table, current, onMine, onTheirs }: ConflictDialogProps) => (
  <FullSheet
    title="This gown was saved elsewhere meanwhile"
    help="Look at both and choose one; the other is kept and can be fetched back."
    actions={
      <>
        <Button kind="primary" onClick={onMine}>
          Keep mine
        </Button>
        <Button onClick={onTheirs}>Take the saved one</Button>
        <p className="text-sm text-slate sm:basis-full">
          Keep mine: the saved one becomes a revision. Take the saved one: yours stays one step
          back, under Undo.
        </p>
      </>
    }
  >
    <SideBySide
      unit={table.unit}
      left={{
        title: 'Mine',
        note: 'on this table, not saved yet',
        work: table,
        pieces: table.drawn.draft?.pieces,
      }}
      right={{
        title: 'Saved',
        note: `from ${current.lastSave.device}, ${momentWords(current.lastSave.savedAt)}`,
        work: choicesOf(current.content).choices,
        pieces: current.drawn?.pieces,
      }}
    />
  </FullSheet>
);
