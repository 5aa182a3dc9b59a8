import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRef } from 'react';
import { Link, useNavigate } from 'react-router-dom';

import type { Gown } from '#shared/api/gowns.ts';
import { depthKeys } from '#shared/regrade/style-depths.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import type { Drafted } from '#shared/engine/drafted.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { newId } from '../../../lib/new-id.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { type ListedCard, sendNewGown, sendRegrade } from '../queries.ts';

type KeepRegradeProps = {
  readonly gown: Gown;
  readonly card: ListedCard;
  readonly after: Drafted;
};

/** The depths a gown was redrawn with; a block has none. */
const depthsOf = ({ inputs }: Drafted) =>
  inputs.garment === undefined || inputs.garment === 'gown'
    ? Object.fromEntries(depthKeys.map((key) => [key, inputs.style[key]]))
    : {};

/** Keeps a regraded gown: a new revision of it, or a new gown where the card is another person's. */
export const KeepRegrade = ({ gown, card, after }: KeepRegradeProps) => {
  const client = useQueryClient();
  const navigate = useNavigate();
  const saveId = useRef(newId());
  const another = gown.personId !== null && gown.personId !== card.person.id;
  const keeping = useMutation({
    mutationFn: async () => {
      if (!another) {
        await sendRegrade(gown.id, {
          saveId: saveId.current,
          baseVersion: gown.version,
          engine: engineVersion,
          cardId: card.id,
          depths: depthsOf(after),
        });
        return gown.id;
      }
      const content = {
        typed: { unit: gown.content.typed.unit, fields: {} },
        unread: [],
        inputs: after.inputs,
      };
      const title = `${gown.title} for ${card.person.name}`.slice(0, 80);
      return (await sendNewGown({ saveId: saveId.current, title, content, cardId: card.id })).id;
    },
    onSuccess: async (id) => {
      saveId.current = newId();
      await client.invalidateQueries();
      if (another) void navigate(`/gowns/${id}`);
    },
  });
  return (
    <div className="space-y-2">
      <div className="flex flex-wrap items-center gap-4">
        <Button
          kind="primary"
          disabled={keeping.isPending || keeping.isSuccess}
          onClick={() => keeping.mutate()}
        >
          {another ? `Keep as a new gown for ${card.person.name}` : 'Keep as a new revision'}
        </Button>
        {keeping.isSuccess && !another && (
          <>
            <span role="status" className="text-verdigris">
              ✓ kept; the gown as it was is kept as well
            </span>
            <Link to={`/gowns/${gown.id}`} className="text-brass underline underline-offset-4">
              To the drafting table
            </Link>
            <Link
              to={`/gowns/${gown.id}/print`}
              className="text-brass underline underline-offset-4"
            >
              Print it
            </Link>
          </>
        )}
      </div>
      {keeping.isError && <Notice>{failureWords(keeping.error)}</Notice>}
    </div>
  );
};
