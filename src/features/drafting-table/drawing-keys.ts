import type { Point } from '#shared/geometry/point.ts';

import type { Tool } from './components/table-tools.tsx';

/** What the keys do on the drawing with nothing in the hand. */
type LookKeys = {
  readonly pan: (by: Point) => void;
  readonly zoom: (by: number) => void;
  readonly fit: () => void;
  readonly walkSeams: (by: number) => void;
  readonly act: () => void;
  readonly letGo: () => void;
};

/** What they do with a tool in it. */
type ToolKeys = {
  readonly step: (by: Point, far: boolean) => void;
  readonly walk: (by: number) => void;
  readonly act: () => void;
  readonly letGo: () => void;
};

const ways: Readonly<Record<string, Point>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: -1 },
  ArrowDown: { x: 0, y: 1 },
};

/** Pixels the drawing is moved by at a press. */
const panned = 60;

/** What a key does on the drawing; nothing where it has no meaning there. */
export function drawingKey(
  { key, shiftKey }: { readonly key: string; readonly shiftKey: boolean },
  look: LookKeys,
  tool: ToolKeys | undefined,
): (() => void) | undefined {
  const way = ways[key];
  if (way !== undefined) {
    if (tool !== undefined) return () => tool.step(way, shiftKey);
    return () => look.pan({ x: -way.x * panned, y: -way.y * panned });
  }
  const walk = tool?.walk ?? look.walkSeams;
  const others: Readonly<Record<string, (() => void) | undefined>> = {
    '+': () => look.zoom(1.25),
    '=': () => look.zoom(1.25),
    '-': () => look.zoom(0.8),
    '0': look.fit,
    n: () => walk(1),
    p: () => walk(-1),
    Escape: tool?.letGo ?? look.letGo,
    Enter: tool?.act ?? look.act,
    ' ': tool?.act,
  };
  return others[key];
}

/** The keys in words, for who reaches the drawing by them. */
export const keyWords: { readonly [T in Tool]: string } = {
  look: 'Arrow keys move, + and − zoom, 0 fits, N and P walk the seams, Tab reaches the handles, Enter prints',
  move: 'N and P choose a piece, arrow keys move it, with Shift farther, Enter snaps it back',
  tape: 'N and P go from corner to corner, arrow keys step, Enter holds the tape there, Escape lets go',
};
