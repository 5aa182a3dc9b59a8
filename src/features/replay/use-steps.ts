import { useCallback, useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';

import type { Step } from '#shared/drafting/step.ts';
import { placeOf } from '#shared/lesson/same-step.ts';

/** Seconds a step stays while the replay plays by itself. */
export const paces = [
  { value: '4', label: 'quick' },
  { value: '8', label: 'even' },
  { value: '15', label: 'slow' },
] as const;
export type Pace = (typeof paces)[number]['value'];

/** Where a replay stands, and the ways to move it. */
export type Steps = {
  readonly place: number;
  readonly last: number;
  readonly playing: boolean;
  readonly pace: Pace;
  readonly go: (place: number) => void;
  readonly play: (playing: boolean) => void;
  readonly setPace: (pace: Pace) => void;
};

/** The step stands in the address, so that it can be returned to and passed on; playing does not. */
export function useSteps(steps: readonly Step[]): Steps {
  const [search, setSearch] = useSearchParams();
  const [playing, setPlaying] = useState(false);
  const [pace, setPace] = useState<Pace>('8');
  const last = Math.max(0, steps.length - 1);
  const place = placeOf(steps, search.get('step') ?? undefined);
  const show = useCallback(
    (next: number) => {
      const id = steps[Math.min(last, Math.max(0, next))]?.id;
      if (id === undefined) return;
      setSearch(
        (before) => {
          const after = new URLSearchParams(before);
          after.set('step', id);
          return after;
        },
        { replace: true },
      );
    },
    [steps, last, setSearch],
  );
  const showNow = useRef(show);
  useEffect(() => {
    showNow.current = show;
  });
  useEffect(() => {
    if (!playing) return;
    const timer = setTimeout(
      () => {
        if (place >= last) setPlaying(false);
        else showNow.current(place + 1);
      },
      Number(pace) * 1000,
    );
    return () => clearTimeout(timer);
  }, [playing, place, last, pace]);
  return {
    place,
    last,
    playing,
    pace,
    go: (next) => {
      setPlaying(false);
      show(next);
    },
    play: (on) => {
      if (on && place >= last) show(0);
      setPlaying(on);
    },
    setPace,
  };
}
