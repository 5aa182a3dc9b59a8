import { expect, test } from 'vitest';

import {
  fitted,
  toPaper,
  toScreen,
  zoomed,
} from '../../../../../src/features/drafting-table/canvas/view.ts';

const box = { left: -30, top: 10, right: 900, bottom: 1400 };
const size = { width: 700, height: 500 };

test('a fitted drawing lies on the canvas with all its corners, clear of the rod', () => {
  for (const place of ['corner', 'middle'] as const) {
    const view = fitted(box, size, place);
    const first = toScreen(view, { x: box.left, y: box.top });
    const last = toScreen(view, { x: box.right, y: box.bottom });
    expect(first.x).toBeGreaterThanOrEqual(26);
    expect(first.y).toBeGreaterThanOrEqual(26);
    expect(last.x).toBeLessThanOrEqual(size.width);
    expect(last.y).toBeLessThanOrEqual(size.height);
  }
});

test('what lies under the pointer stays there while the drawing grows', () => {
  const view = fitted(box, size, 'corner');
  const pointer = { x: 412, y: 133 };
  const before = toPaper(view, pointer);
  const after = toPaper(zoomed(view, 1.7, pointer), pointer);
  expect(after.x).toBeCloseTo(before.x, 9);
  expect(after.y).toBeCloseTo(before.y, 9);
});

test('a drawing can be made neither so small nor so large that it is lost', () => {
  const at = { x: 0, y: 0 };
  const view = fitted(box, size, 'corner');
  expect(zoomed(view, 1e-9, at).scale).toBeGreaterThan(0.01);
  expect(zoomed(view, 1e9, at).scale).toBeLessThan(10);
});
