import { useMemo, useState, type ReactNode } from 'react';
import { Link, useSearchParams } from 'react-router-dom';

import { type Drafted } from '#shared/engine/drafted.ts';
import { sameStep } from '#shared/lesson/same-step.ts';
import type { Unit } from '#shared/units/said.ts';

import { useMedia } from '../../../lib/use-media.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { Wordmark } from '../../../ui/wordmark.tsx';
import { useStepKeys } from '../use-step-keys.ts';
import type { Steps } from '../use-steps.ts';
import { Stage } from './stage.tsx';
import { StepControls } from './step-controls.tsx';
import { StepList } from './step-list.tsx';
import { Telling } from './telling.tsx';

type ReplayProps = {
  readonly draft: Drafted;
  readonly steps: Steps;
  readonly unit: Unit;
  readonly onUnit: (unit: Unit) => void;
  /** Drawn from a learner's own measures in the same style. */
  readonly own?: Drafted | undefined;
  /** What is replayed. */
  readonly title: string;
  /** The way back, where there is one. */
  readonly back?: { readonly to: string; readonly label: string } | undefined;
  /** What else can be done with it. */
  readonly tools: ReactNode;
  /** Something that holds for the whole class, above the drawing. */
  readonly notice?: ReactNode;
};

/** A draft told step by step: its drawing and its sentence, forth and back, for one reader or for a room. */
export const Replay = (props: ReplayProps) => {
  const { draft, steps, unit, onUnit, own, title, back, tools, notice } = props;
  const { place } = steps;
  const [search, setSearch] = useSearchParams();
  const [whole, setWhole] = useState(false);
  const [why, setWhy] = useState(false);
  const [listing, setListing] = useState(false);
  const [mine, setMine] = useState(false);
  const wide = useMedia('(min-width: 1100px)');
  const beside = useMedia('(min-width: 700px)');
  const far = search.get('view') === 'projector';
  const look = (on: boolean) => {
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        if (on) after.set('view', 'projector');
        else after.delete('view');
        return after;
      },
      { replace: true },
    );
    fullScreen(on);
  };
  useStepKeys(steps, {
    w: () => setWhy(!why),
    f: () => look(!far),
    ...(far ? { Escape: () => look(false) } : {}),
  });
  const ownPlace = useMemo(
    () => own && { told: own, ...sameStep(draft.steps, place, own.steps) },
    [own, draft.steps, place],
  );
  const tutors = useMemo(() => ({ told: draft, place }), [draft, place]);
  const stages = (
    <div className={`grid h-full min-h-0 ${ownPlace && beside ? 'grid-cols-2' : 'grid-cols-1'}`}>
      {(ownPlace === undefined || beside || !mine) && (
        <Stage
          told={draft}
          place={place}
          whole={whole}
          far={far}
          label={own ? 'Tutor' : title}
          other={ownPlace}
        />
      )}
      {ownPlace !== undefined && (beside || mine) && (
        <div className="min-h-0 border-l border-rule">
          <Stage
            told={ownPlace.told}
            place={ownPlace.place}
            whole={whole}
            far={far}
            label="Your measures"
            other={tutors}
          />
        </div>
      )}
    </div>
  );
  const telling = (
    <Telling
      told={draft}
      place={place}
      unit={unit}
      far={far}
      own={beside || mine ? ownPlace : undefined}
      alone={!beside && mine}
      why={why}
      onWhy={() => setWhy(!why)}
    />
  );
  const closer = (
    <Button kind="quiet" slim aria-pressed={whole} onClick={() => setWhole(!whole)}>
      {whole ? 'Look closer' : 'Whole half'}
    </Button>
  );

  if (far) {
    return (
      <main id="content" className="flex h-dvh flex-col overflow-hidden bg-ground">
        <div className="min-h-0 grow basis-0">{stages}</div>
        <div
          className="max-h-[48dvh] shrink-0 overflow-y-auto border-t-2 border-ink px-6 py-3"
          tabIndex={0}
        >
          {telling}
        </div>
        <div className="flex shrink-0 flex-wrap items-center justify-between gap-x-4 px-6 pb-2">
          <StepControls steps={steps} bare />
          <span className="flex items-center gap-2">
            {closer}
            <Button kind="quiet" slim onClick={() => look(false)}>
              Leave projector view
            </Button>
          </span>
        </div>
      </main>
    );
  }

  return (
    <div className="flex h-dvh flex-col overflow-hidden">
      <header className="flex shrink-0 flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule px-3 py-2 sm:px-4">
        <Link to="/" aria-label="Ellwand, to the front page">
          <Wordmark compact />
        </Link>
        {back !== undefined && (
          <Link to={back.to} className="text-slate hover:text-ink">
            {back.label}
          </Link>
        )}
        <p className="min-w-0 grow truncate font-semibold">{title}</p>
        <div className="flex flex-wrap items-center gap-x-1 gap-y-1">
          {tools}
          <Button kind="quiet" slim onClick={() => look(true)}>
            Projector view
          </Button>
        </div>
        <UnitChoice unit={unit} onUnit={onUnit} />
        <span className="hidden sm:block">
          <ThemeToggle />
        </span>
      </header>
      {notice}
      <div className="flex min-h-0 grow">
        {wide && (
          <div
            className="w-[17rem] shrink-0 overflow-y-auto border-r border-rule bg-cloth px-3 py-4"
            tabIndex={0}
          >
            <StepList steps={draft.steps} place={place} onChoose={steps.go} />
          </div>
        )}
        <main id="content" className="flex min-h-0 min-w-0 grow flex-col">
          <div className="min-h-0 grow basis-0">{stages}</div>
          <div
            className="max-h-[46dvh] shrink-0 overflow-y-auto border-t border-rule bg-cloth px-4 pt-3 sm:px-6"
            tabIndex={0}
          >
            <div className="mx-auto max-w-[70rem]">{telling}</div>
          </div>
          <div className="shrink-0 border-t border-rule bg-cloth px-4 py-2 sm:px-6">
            <div className="mx-auto flex max-w-[70rem] flex-wrap items-center justify-between gap-x-4 gap-y-1">
              <StepControls steps={steps} />
              <span className="flex items-center gap-1">
                {ownPlace !== undefined && !beside && (
                  <Button kind="quiet" slim onClick={() => setMine(!mine)}>
                    {mine ? 'Tutor’s drawing' : 'My drawing'}
                  </Button>
                )}
                {closer}
                {!wide && (
                  <Button kind="quiet" slim onClick={() => setListing(true)}>
                    All steps
                  </Button>
                )}
              </span>
            </div>
          </div>
        </main>
      </div>
      <Dialog title="All steps" open={listing && !wide} onClose={() => setListing(false)}>
        <div className="pt-3">
          <StepList
            steps={draft.steps}
            place={place}
            onChoose={(next) => {
              steps.go(next);
              setListing(false);
            }}
          />
        </div>
      </Dialog>
    </div>
  );
};

/** The whole screen, where the browser allows it; where it does not, the view is the same in its window. */
function fullScreen(on: boolean): void {
  if (!document.fullscreenEnabled || on === (document.fullscreenElement !== null)) return;
  const done = on ? document.documentElement.requestFullscreen() : document.exitFullscreen();
  done.catch(() => undefined);
}
