import { useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';

import { gownContent, type Gown, type GownContent } from '#shared/api/gowns.ts';

import { gownQuery } from '../gown-queries.ts';
import { keptHistory } from '../history.ts';
import type { DraftPlace } from '../kept-drafts.ts';
import { useDraftPlace } from '../use-draft-place.ts';
import { benchOf, type GownStart } from './gown-table.tsx';
import { mayOpenKept, OpeningFailed } from './opening-failed.tsx';
import { RedrawingSheet } from './redrawing-sheet.tsx';

type OpenedGownProps = {
  readonly gownId: string;
  /** The form for who is no longer signed in. */
  readonly signIn: (onSignedIn: () => void) => ReactNode;
  /** What is done with the gown once it is open. */
  readonly children: (start: () => GownStart, place: DraftPlace<GownContent>) => ReactNode;
};

/**
 * A gown with what this browser has not sent of it yet; before it opens, what stands in the way: no answer,
 * signed out, or older rules that drew it otherwise.
 */
export const OpenedGown = ({ gownId, signIn, children }: OpenedGownProps) => {
  const place = useDraftPlace('gown', gownId, gownContent);
  const gown = useQuery(gownQuery(gownId));
  const [agreed, setAgreed] = useState(false);
  const navigate = useNavigate();
  if (place === undefined || gown.isPending) {
    return (
      <p role="status" className="p-6 text-slate">
        Fetching the gown…
      </p>
    );
  }
  const { found } = place;
  if (gown.isError && (found === undefined || !mayOpenKept(gown.error))) {
    return (
      <OpeningFailed
        what="gown"
        error={gown.error}
        unsent={found?.changed === true}
        signIn={signIn}
        onRetry={() => void gown.refetch()}
      />
    );
  }
  const older = gown.data === undefined || agreed ? undefined : drawnByOlder(gown.data);
  if (older !== undefined) {
    return (
      <RedrawingSheet
        gown={older}
        onRedraw={() => setAgreed(true)}
        onLeave={() => void navigate('/gowns')}
      />
    );
  }
  return children(() => startOf(place, gown.data, agreed), place);
};

type DrawnGown = Gown & { readonly drawn: NonNullable<Gown['drawn']> };

/** The gown where today's rules would draw it otherwise, or not at all. */
function drawnByOlder(gown: Gown): DrawnGown | undefined {
  const { drawn, redrawing } = gown;
  if (drawn === null || redrawing === null) return undefined;
  return redrawing.changes.length + redrawing.problems.length === 0
    ? undefined
    : { ...gown, drawn };
}

/** Work this browser has not sent yet goes before what the server has; else the server's. */
function startOf(
  { found }: DraftPlace<GownContent>,
  gown: Gown | undefined,
  redraw: boolean,
): GownStart {
  if (found !== undefined && (gown === undefined || found.changed || found.base === gown.version)) {
    const opened = benchOf(found.content, gown?.drawn);
    const { table } = opened;
    return {
      bench: { table, history: keptHistory(found.history, table, table.unit) },
      title: gown?.title ?? found.title,
      base: found.base,
      changed: found.changed || redraw,
      unsent: found.unsent,
    };
  }
  if (gown === undefined) throw new Error('there is neither a gown nor a draft of one');
  return {
    bench: benchOf(gown.content, gown.drawn),
    title: gown.title,
    base: gown.version,
    changed: redraw,
    unsent: undefined,
  };
}
