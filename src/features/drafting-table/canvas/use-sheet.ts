import { useLayoutEffect, useRef, type RefObject } from 'react';

import { readColours, type Colours } from './colours.ts';
import type { Layout } from './layout.ts';
import { laySheet, type Lit, type Sheet } from './sheet.ts';
import type { Size, View } from './view.ts';

type Shown = {
  readonly layout: Layout;
  readonly lit: Lit;
  readonly view: View;
  readonly size: Size;
  readonly allowances: boolean;
  readonly theme: string;
};

/** The canvas follows what is shown: each part of it is made anew only where it changed. */
export function useSheet(
  canvas: RefObject<HTMLCanvasElement | null>,
  { layout, lit, view, size, allowances, theme }: Shown,
): RefObject<Sheet | undefined> {
  const sheet = useRef<Sheet>(undefined);
  const colours = useRef<Colours>(undefined);
  useLayoutEffect(() => {
    if (canvas.current === null) return;
    const laid = laySheet(canvas.current);
    sheet.current = laid;
    return () => laid.close();
  }, [canvas]);
  useLayoutEffect(() => {
    const beside = canvas.current?.parentElement;
    if (beside) colours.current = readColours(beside);
  }, [canvas, theme]);
  useLayoutEffect(() => {
    if (size.width > 0) sheet.current?.resize(size);
  }, [size]);
  useLayoutEffect(() => {
    if (colours.current === undefined) return;
    sheet.current?.draw(layout, { colours: colours.current, allowances });
  }, [layout, allowances, theme]);
  useLayoutEffect(() => {
    if (colours.current === undefined) return;
    sheet.current?.light(layout, lit, colours.current);
    sheet.current?.look(view);
  }, [layout, lit, view, size, allowances, theme]);
  return sheet;
}
