import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';

import { failureWords } from '../../../lib/failure-words.ts';
import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { WithdrawButton } from '../components/withdraw-button.tsx';
import { classesQuery } from '../queries.ts';

/** Every class of one's own that is open now. */
export const ClassesPage = () => {
  const classes = useQuery(classesQuery);
  return (
    <main id="content" className="mx-auto w-full max-w-4xl grow px-4 py-8 sm:px-8">
      <title>Ellwand · classes</title>
      <h1 className="text-3xl font-semibold">Classes</h1>
      <p className="mt-2 max-w-prose">
        Gowns you have opened to a class. Open one’s replay and turn the steps: those who have the
        link and follow see the step you are at.
      </p>
      {classes.isPending && (
        <p role="status" className="mt-6 text-slate">
          Fetching…
        </p>
      )}
      {classes.isError && (
        <div className="mt-6">
          <Notice>
            {failureWords(classes.error)}{' '}
            <Button kind="quiet" slim onClick={() => void classes.refetch()}>
              Try again
            </Button>
          </Notice>
        </div>
      )}
      {classes.data?.length === 0 && (
        <p className="mt-6 text-lg">
          No class is open. Open a gown, choose Replay and then Share to make a link for one.
        </p>
      )}
      <ul className="mt-6">
        {classes.data?.map((each) => (
          <li
            key={each.id}
            className="flex flex-wrap items-center justify-between gap-x-4 border-b border-rule py-2"
          >
            <Link
              to={`/gowns/${each.gownId}/replay?step=${encodeURIComponent(each.step)}`}
              className="text-lg font-semibold hover:underline"
            >
              {each.title}
            </Link>
            <span className="flex items-center gap-4 text-slate">
              {`until ${momentWords(each.expiresAt)}`}
              <WithdrawButton classId={each.id} title={each.title} />
            </span>
          </li>
        ))}
      </ul>
    </main>
  );
};
