import type { Point } from '#shared/geometry/point.ts';

type Hand = {
  readonly move: (to: Point) => void;
  readonly drop: () => void;
};

/**
 * Follows the pointer an element has captured until it is let go. Past React, which would look through
 * the page for handlers at every move.
 */
export function whileHeld(element: Element, { move, drop }: Hand): void {
  const ended = new AbortController();
  const listen = (type: string, then: (event: PointerEvent) => void) =>
    element.addEventListener(
      type,
      (event) => {
        event.stopPropagation();
        if (event instanceof PointerEvent) then(event);
      },
      { signal: ended.signal },
    );
  const end = () => {
    ended.abort();
    drop();
  };
  listen('pointermove', (event) => move({ x: event.clientX, y: event.clientY }));
  listen('pointerup', end);
  listen('pointercancel', end);
}
