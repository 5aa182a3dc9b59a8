import { useEffect, useMemo, useState, type ReactNode } from 'react';

import type { CardInProgress } from '#shared/body/check-card.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';

import { Button } from '../../../ui/button.tsx';
import { inUnit, keepOwnCard, keptOwnCard, ownDraft } from '../own-card.ts';
import type { Steps } from '../use-steps.ts';
import { OwnMeasures } from './own-measures.tsx';
import { Replay } from './replay.tsx';

type ReplayedDraftProps = {
  readonly draft: Drafted;
  readonly steps: Steps;
  readonly unit: Unit;
  readonly onUnit: (unit: Unit) => void;
  readonly title: string;
  readonly back?: { readonly to: string; readonly label: string } | undefined;
  readonly onTable?: CardInProgress | undefined;
  /** Tools of this place, before those every replay has. */
  readonly tools?: ReactNode;
  readonly notice?: ReactNode;
};

/** A replay with a learner's own measures beside it. */
export const ReplayedDraft = (props: ReplayedDraftProps) => {
  const { draft, unit, onTable, tools, ...rest } = props;
  const [kept, setCard] = useState(() => keptOwnCard(unit));
  const [open, setOpen] = useState(false);
  const card = useMemo(() => inUnit(kept, unit), [kept, unit]);
  const drawn = useMemo(() => ownDraft(draft.inputs, card), [draft.inputs, card]);
  useEffect(() => keepOwnCard(card), [card]);
  return (
    <>
      <Replay
        {...rest}
        draft={draft}
        unit={unit}
        own={drawn !== undefined && 'draft' in drawn ? drawn.draft : undefined}
        tools={
          <>
            {tools}
            <Button kind="quiet" slim onClick={() => setOpen(true)}>
              My measures
            </Button>
          </>
        }
      />
      <OwnMeasures
        open={open}
        onClose={() => setOpen(false)}
        card={card}
        onCard={setCard}
        drawn={drawn}
        onTable={onTable}
      />
    </>
  );
};
