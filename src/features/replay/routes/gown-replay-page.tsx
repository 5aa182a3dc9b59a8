import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';

import type { Drafted } from '#shared/engine/drafted.ts';
import { garmentTitles } from '#shared/exports/garment-titles.ts';
import type { Unit } from '#shared/units/said.ts';

import { useUnit } from '../../../lib/use-unit.ts';
import { Button } from '../../../ui/button.tsx';
import { NothingDrawn } from '../components/nothing-drawn.tsx';
import { ReplayedDraft } from '../components/replayed-draft.tsx';
import { ShareSheet } from '../components/share-sheet.tsx';
import { Worksheet } from '../components/worksheet.tsx';
import { classesQuery, turnTo } from '../queries.ts';
import { useSteps } from '../use-steps.ts';

type GownReplayPageProps = {
  readonly gownId: string;
  /** What lies on the gown's table, and whether it is that of the figures there. */
  readonly draft: Drafted | undefined;
  readonly fresh: boolean;
  readonly title: string;
  readonly unit: Unit;
};

/** The replay of a gown that is kept, to look at and to share. */
export const GownReplayPage = ({ draft, ...rest }: GownReplayPageProps) =>
  draft === undefined ? (
    <NothingDrawn to={`/gowns/${rest.gownId}`} label="To its drafting table" />
  ) : (
    <Told draft={draft} {...rest} />
  );

type ToldProps = GownReplayPageProps & { readonly draft: Drafted };

const Told = ({ gownId, draft, fresh, title, unit: first }: ToldProps) => {
  const [unit, setUnit] = useUnit(first);
  const [sharing, setSharing] = useState(false);
  const steps = useSteps(draft.steps);
  const step = draft.steps[steps.place]?.id ?? '';
  const classes = useQuery(classesQuery);
  const own = classes.data?.filter((each) => each.gownId === gownId) ?? [];
  const lost = useTutorsTurn(own.map(({ id }) => id).join(), step);
  return (
    <>
      <title>{`Ellwand · ${title}, replay`}</title>
      <ReplayedDraft
        draft={draft}
        steps={steps}
        unit={unit}
        onUnit={setUnit}
        title={title}
        back={{ to: `/gowns/${gownId}`, label: 'Drafting table' }}
        tools={
          <>
            <Button kind="quiet" slim onClick={() => setSharing(true)}>
              Share
            </Button>
            <Worksheet inputs={draft.inputs} unit={unit} />
          </>
        }
        notice={
          <>
            {!fresh && (
              <p className="border-b border-rule bg-cloth px-4 py-1 text-sm">
                A figure on the table is open: this tells the last draft that could be drawn.
              </p>
            )}
            {own.length > 0 && (
              <p
                role="status"
                className={`border-b border-rule bg-cloth px-4 py-1 text-sm ${lost ? 'text-madder' : 'text-verdigris'}`}
              >
                {lost
                  ? 'The class cannot be reached: those who follow stay at an earlier step.'
                  : 'A class is open: those who follow see the step you are at.'}
              </p>
            )}
          </>
        }
      />
      <ShareSheet
        gownId={gownId}
        what={garmentTitles[draft.garment].toLowerCase()}
        step={step}
        unit={unit}
        open={sharing}
        onClose={() => setSharing(false)}
        classes={own}
      />
    </>
  );
};

/** Turns the classes with these ids to the step the tutor is at; whether the last turn did not arrive. */
function useTutorsTurn(ids: string, step: string): boolean {
  const [lost, setLost] = useState(false);
  useEffect(() => {
    if (ids === '' || step === '') return;
    Promise.all(ids.split(',').map((id) => turnTo(id, step))).then(
      () => setLost(false),
      () => setLost(true),
    );
  }, [ids, step]);
  return lost;
}
