import { useEffect, useRef, useState } from 'react';

import type { Box } from '#shared/sheets/layout.ts';

import { useMedia } from '../../lib/use-media.ts';

/** The eye takes so long from one part of the paper to the next, ms. */
const travel = 420;

const between = (from: Box, to: Box, share: number): Box => ({
  x: from.x + (to.x - from.x) * share,
  y: from.y + (to.y - from.y) * share,
  width: from.width + (to.width - from.width) * share,
  height: from.height + (to.height - from.height) * share,
});

/** The box that is looked at, on its way to the one asked for; at once there where motion is unwanted. */
export function useLook(wanted: Box, frame: string): Box {
  const calm = useMedia('(prefers-reduced-motion: reduce)');
  const [shown, setShown] = useState(wanted);
  const at = useRef({ box: wanted, frame });
  const { x, y, width, height } = wanted;
  useEffect(() => {
    const to = { x, y, width, height };
    const from = at.current;
    if (calm || from.frame !== frame) {
      at.current = { box: to, frame };
      setShown(to);
      return;
    }
    let turn = 0;
    const start = performance.now();
    const move = (now: number) => {
      const share = Math.min(1, Math.max(0, (now - start) / travel));
      const box = between(from.box, to, share * share * (3 - 2 * share));
      at.current = { box, frame };
      setShown(box);
      if (share < 1) turn = requestAnimationFrame(move);
    };
    turn = requestAnimationFrame(move);
    return () => cancelAnimationFrame(turn);
  }, [x, y, width, height, frame, calm]);
  return shown;
}
