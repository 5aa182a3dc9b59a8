import { useEffect } from 'react';

import type { Steps } from './use-steps.ts';

/** Keys that type or choose something where they are pressed. */
const typesThere = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  target.closest('input:not([type=radio]), textarea, select, dialog') !== null;

const pressesThere = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement && target.closest('button, a, summary, input') !== null;

/**
 * Arrows and a pointer remote's Page Up and Down turn the steps, Home and End go to the ends, the space
 * bar plays and pauses; `more` are the keys of the view itself.
 */
export function useStepKeys(steps: Steps, more: Readonly<Record<string, () => void>>): void {
  useEffect(() => {
    const acts: Readonly<Record<string, () => void>> = {
      ...more,
      ArrowRight: () => steps.go(steps.place + 1),
      ArrowDown: () => steps.go(steps.place + 1),
      PageDown: () => steps.go(steps.place + 1),
      ArrowLeft: () => steps.go(steps.place - 1),
      ArrowUp: () => steps.go(steps.place - 1),
      PageUp: () => steps.go(steps.place - 1),
      Home: () => steps.go(0),
      End: () => steps.go(steps.last),
      ' ': () => steps.play(!steps.playing),
    };
    const press = (event: KeyboardEvent) => {
      if (event.metaKey || event.ctrlKey || event.altKey || typesThere(event.target)) return;
      const ownKey = event.key === ' ' || event.key.startsWith('Arrow');
      const radio = event.target instanceof HTMLInputElement;
      if (ownKey && (event.key === ' ' || radio) && pressesThere(event.target)) return;
      const act = acts[event.key];
      if (act === undefined) return;
      event.preventDefault();
      act();
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  });
}
