import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';
import { Link, useParams } from 'react-router-dom';

import type { Answer } from '#shared/api/endpoint.ts';
import type { visitClass } from '#shared/api/classes.ts';
import type { CardInProgress } from '#shared/body/check-card.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { placeOf } from '#shared/lesson/same-step.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { queryClient } from '../../../lib/query-client.ts';
import { useUnit } from '../../../lib/use-unit.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { ReplayedDraft } from '../components/replayed-draft.tsx';
import { Worksheet } from '../components/worksheet.tsx';
import { classQuery, gone, tutorsStepQuery } from '../queries.ts';
import { useSteps } from '../use-steps.ts';

type ClassPageProps = {
  /** The card that lies on this browser's own drafting table. */
  readonly onTable?: CardInProgress | undefined;
};

/** A class on a learner's own screen: without an account, following the tutor or leafing alone. */
export const ClassPage = ({ onTable }: ClassPageProps) => {
  const { token = '' } = useParams();
  return (
    <QueryClientProvider client={queryClient}>
      <title>Ellwand · class</title>
      <meta name="robots" content="noindex" />
      <Visit token={token} onTable={onTable} />
    </QueryClientProvider>
  );
};

const Visit = ({ token, onTable }: ClassPageProps & { readonly token: string }) => {
  const visit = useQuery(classQuery(token));
  if (visit.isPending) {
    return (
      <p role="status" className="p-6 text-slate">
        Fetching the class…
      </p>
    );
  }
  if (visit.isError) {
    return (
      <main id="content" className="mx-auto max-w-xl space-y-4 p-6">
        <h1 className="text-2xl font-semibold">
          {gone(visit.error) ? 'No class is open here' : 'This class did not open'}
        </h1>
        <p>
          {gone(visit.error)
            ? 'The link has run out, was withdrawn, or was not copied whole. Ask your tutor for a new one.'
            : failureWords(visit.error)}
        </p>
        <p className="flex items-center gap-4">
          <Button kind="primary" onClick={() => void visit.refetch()}>
            Try again
          </Button>
          <Link className="text-brass underline" to="/">
            To the front page
          </Link>
        </p>
      </main>
    );
  }
  return <Attended token={token} visit={visit.data} onTable={onTable} />;
};

type AttendedProps = ClassPageProps & {
  readonly token: string;
  readonly visit: Answer<typeof visitClass>;
};

const Attended = ({ token, visit, onTable }: AttendedProps) => {
  const draft = useMemo(() => draftAny(visit.inputs), [visit.inputs]);
  const [unit, setUnit] = useUnit(visit.unit);
  const [following, setFollowing] = useState(true);
  const steps = useSteps(draft.steps);
  const tutor = useQuery(tutorsStepQuery(token, true));
  const tutors = placeOf(draft.steps, tutor.data ?? visit.step);
  const { go, place } = steps;
  useEffect(() => {
    if (following && place !== tutors) go(tutors);
    // Only the tutor's turning leads: one's own leafing has ended the following already.
  }, [following, tutors]);
  const ended = gone(tutor.error);
  const leafing = {
    ...steps,
    go: (next: number) => {
      setFollowing(false);
      go(next);
    },
    play: (on: boolean) => {
      setFollowing(false);
      steps.play(on);
    },
  };
  return (
    <ReplayedDraft
      draft={draft}
      steps={leafing}
      unit={unit}
      onUnit={setUnit}
      title={visit.title}
      onTable={onTable}
      tools={
        <>
          <Button
            kind="quiet"
            slim
            aria-pressed={following}
            disabled={ended}
            onClick={() => setFollowing(!following)}
          >
            {following ? '✓ Following the tutor' : 'Follow the tutor'}
          </Button>
          <Worksheet inputs={draft.inputs} unit={unit} />
        </>
      }
      notice={
        ended ? (
          <Notice>
            The tutor has ended this class. What is shown stays until you leave the page.
          </Notice>
        ) : (
          tutor.isError && <Notice>{failureWords(tutor.error)}</Notice>
        )
      }
    />
  );
};
