import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';

import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { GownPicture } from '../components/gown-picture.tsx';
import { ListFrame } from '../components/list-frame.tsx';
import { ListTabs } from '../components/list-tabs.tsx';
import { RecordActions } from '../components/record-actions.tsx';
import { gownsQuery, useGownDeed, type ListedGown } from '../queries.ts';

/** Every gown of one's own, last saved first. */
export const GownsPage = () => {
  const list = useQuery(gownsQuery);
  const deed = useGownDeed();
  const navigate = useNavigate();
  return (
    <ListFrame
      title="Gowns"
      help="Open a gown to go on drawing it; every change is kept as you make it."
      tabs={<ListTabs />}
      none="No gown yet. A new one opens on an empty drafting table."
      list={list}
      deed={deed}
      make={
        <Button
          kind="primary"
          disabled={deed.isPending}
          onClick={() =>
            deed.mutate(
              { kind: 'new', name: newTitle() },
              { onSuccess: ({ id }) => id !== undefined && void navigate(`/gowns/${id}`) },
            )
          }
        >
          New gown
        </Button>
      }
      render={(gown) => (
        <>
          <Link to={`/gowns/${gown.id}`} className="group block">
            <GownPicture picture={gown.picture} />
            <span className="mt-3 block text-lg leading-tight font-semibold break-words group-hover:underline">
              {gown.title}
            </span>
          </Link>
          <p className="mt-1 mb-2 grow text-sm text-slate">
            {`saved ${momentWords(gown.savedAt)}`}
            <span className="block">{stateWords(gown)}</span>
          </p>
          {gown.drawnBy !== null && <GownLinks gown={gown} />}
          <RecordActions
            record={gown}
            name={gown.title}
            label="Name of the gown"
            goes="Its measures, style and pieces go for good, with every revision and whatever is shared of it."
            deed={deed}
          />
        </>
      )}
    />
  );
};

/** From a drawn gown to what it can be laid over, redrawn for, and stepped to. */
const GownLinks = ({ gown: { id, title } }: { gown: ListedGown }) => (
  <p className="flex flex-wrap gap-x-4 text-sm">
    {[
      { to: `/compare?first=gown:${id}`, label: 'Compare' },
      { to: `/gowns/${id}/regrade`, label: 'Regrade' },
      { to: `/gowns/${id}/nest`, label: 'Nest' },
    ].map(({ to, label }) => (
      <Link
        key={label}
        to={to}
        aria-label={`${label}: ${title}`}
        className="py-1 text-brass underline underline-offset-4"
      >
        {label}
      </Link>
    ))}
  </p>
);

const dayOf = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long' });
const newTitle = (): string => `Gown of ${dayOf.format(new Date())}`;

function stateWords({ drawnBy, fresh }: ListedGown): string {
  if (drawnBy === null) return 'not drawn yet';
  return fresh ? '' : 'figures open: the picture is the last that could be drawn';
}
