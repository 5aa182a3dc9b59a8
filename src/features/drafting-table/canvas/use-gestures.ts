import { useEffect, useRef, type PointerEvent, type RefObject } from 'react';

import { between, distance, subtract, type Point } from '#shared/geometry/point.ts';

type Gestures = {
  /** The pointer or a finger is put down. */
  readonly press?: (at: Point) => void;
  readonly pan: (by: Point) => void;
  readonly zoom: (by: number, at: Point) => void;
  /** The pointer rests on, or a finger taps, a place; pixels in the element. */
  readonly point: (at: Point, touch: boolean) => void;
  /** Put down and lifted at one place; where it is absent, as if the pointer rested there. */
  readonly tap?: ((at: Point, touch: boolean) => void) | undefined;
  readonly leave: () => void;
};

/** Drag to move, wheel or two fingers to zoom, point or tap to ask. */
export function useGestures(element: RefObject<HTMLElement | null>, gestures: Gestures) {
  const held = useRef(new Map<number, Point>());
  const travelled = useRef(0);
  const latest = useRef(gestures);
  useEffect(() => {
    latest.current = gestures;
  });

  useEffect(() => {
    const target = element.current;
    if (target === null) return;
    const wheel = (event: WheelEvent) => {
      event.preventDefault();
      const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 16 : 1;
      const strength = event.ctrlKey ? 0.01 : 0.0016;
      latest.current.zoom(Math.exp(-event.deltaY * lines * strength), placeIn(target, event));
    };
    // React listens to wheel passively, where the page could not be kept from scrolling.
    target.addEventListener('wheel', wheel, { passive: false });
    return () => target.removeEventListener('wheel', wheel);
  }, [element]);

  return {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      const at = placeIn(event.currentTarget, event);
      held.current.set(event.pointerId, at);
      travelled.current = 0;
      gestures.press?.(at);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      const to = placeIn(event.currentTarget, event);
      const from = held.current.get(event.pointerId);
      if (from === undefined) {
        if (event.pointerType !== 'touch') gestures.point(to, false);
        return;
      }
      const other = [...held.current].find(([id]) => id !== event.pointerId)?.[1];
      held.current.set(event.pointerId, to);
      travelled.current += distance(from, to);
      if (other === undefined) {
        gestures.pan(subtract(to, from));
        return;
      }
      gestures.pan(subtract(between(to, other, 0.5), between(from, other, 0.5)));
      gestures.zoom(distance(to, other) / (distance(from, other) || 1), between(to, other, 0.5));
    },
    onPointerUp: (event: PointerEvent<HTMLElement>) => {
      if (!held.current.delete(event.pointerId) || travelled.current > 6) return;
      const tap = gestures.tap ?? gestures.point;
      tap(placeIn(event.currentTarget, event), event.pointerType === 'touch');
    },
    onPointerCancel: (event: PointerEvent<HTMLElement>) => {
      held.current.delete(event.pointerId);
    },
    onPointerLeave: () => {
      if (held.current.size === 0) gestures.leave();
    },
  };
}

function placeIn(element: Element, event: { clientX: number; clientY: number }): Point {
  const box = element.getBoundingClientRect();
  return { x: event.clientX - box.left, y: event.clientY - box.top };
}
