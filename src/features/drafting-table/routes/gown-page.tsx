import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useNavigate, useParams } from 'react-router-dom';

import { gownContent, type Gown, type GownContent } from '#shared/api/gowns.ts';

import { queryClient } from '../../../lib/query-client.ts';
import { benchOf, GownTable, type GownStart } from '../components/gown-table.tsx';
import { mayOpenKept, OpeningFailed } from '../components/opening-failed.tsx';
import { RedrawingSheet } from '../components/redrawing-sheet.tsx';
import { gownQuery } from '../gown-queries.ts';
import { keptHistory } from '../history.ts';
import type { DraftPlace } from '../kept-drafts.ts';
import { useDraftPlace } from '../use-draft-place.ts';

type GownPageProps = {
  /** The form for who is no longer signed in. */
  readonly signIn: (onSignedIn: () => void) => ReactNode;
};

/** The drafting table of one gown. */
export const GownPage = ({ signIn }: GownPageProps) => {
  const { gownId = '' } = useParams();
  return (
    <QueryClientProvider client={queryClient}>
      <OpenGown key={gownId} gownId={gownId} signIn={signIn} />
    </QueryClientProvider>
  );
};

const OpenGown = ({ gownId, signIn }: GownPageProps & { readonly gownId: string }) => {
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
  const start = () => startOf(place, gown.data, agreed);
  return <GownTable gownId={gownId} start={start} place={place} signIn={signIn} />;
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
