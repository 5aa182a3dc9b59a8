import { memo, useLayoutEffect, useMemo, useRef, useState, type Dispatch } from 'react';

import type { Draft } from '#shared/engine/draft.ts';

import { useSize } from '../../../lib/use-size.ts';
import { useTheme } from '../../../lib/use-theme.ts';
import { readColours, type Colours } from '../canvas/colours.ts';
import { Handles } from '../canvas/handles.tsx';
import { asCut, asDrafted } from '../canvas/layout.ts';
import { Lettering } from '../canvas/lettering.tsx';
import { litLines } from '../canvas/lit-lines.ts';
import { Rod } from '../canvas/rod.tsx';
import { laySheet, type Sheet } from '../canvas/sheet.ts';
import { StepPoints } from '../canvas/step-points.tsx';
import { useFraming } from '../canvas/use-framing.ts';
import { useGestures } from '../canvas/use-gestures.ts';
import { toPaper } from '../canvas/view.ts';
import { litSeam, seamIndex } from '../seams.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { DrawingTools } from './drawing-tools.tsx';
import { SeamCallout } from './seam-callout.tsx';

type DrawingProps = {
  readonly draft: Draft;
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

/** Pixels within which a line counts as pointed at: a finger is broader than a pointer. */
const reach = { pointer: 7, touch: 18 };

/** The pieces on the canvas under the rod, with what is pointed at, handled or explained on top. */
export const Drawing = memo(function Drawing({ draft, state, dispatch }: DrawingProps) {
  const frame = useRef<HTMLDivElement>(null);
  const canvas = useRef<HTMLCanvasElement>(null);
  const sheet = useRef<Sheet>(undefined);
  const [held, setHeld] = useState(false);
  const size = useSize(frame);
  const theme = useTheme();
  const drafting = state.panel === 'steps';
  const { pieces } = draft;
  const layout = useMemo(() => (drafting ? asDrafted(pieces) : asCut(pieces)), [drafting, pieces]);
  const key = `${String(drafting)} ${pieces.map((each) => each.name).join()}`;
  const framing = useFraming(key, layout.box, size, !held);
  const { view } = framing;

  const step = drafting ? draft.steps.find((each) => each.id === state.step) : undefined;
  const seam = useMemo(
    () => litSeam(draft, state.seam, state.unit),
    [draft, state.seam, state.unit],
  );
  const lit = useMemo(() => litLines(draft, layout, seam, step), [draft, layout, seam, step]);

  const colours = useRef<Colours>(undefined);
  useLayoutEffect(() => {
    if (canvas.current === null) return;
    const laid = laySheet(canvas.current);
    sheet.current = laid;
    return () => laid.close();
  }, []);
  useLayoutEffect(() => {
    if (frame.current !== null) colours.current = readColours(frame.current);
  }, [theme]);
  useLayoutEffect(() => {
    if (size.width > 0) sheet.current?.resize(size);
  }, [size]);
  useLayoutEffect(() => {
    if (colours.current === undefined) return;
    sheet.current?.draw(layout, { colours: colours.current, allowances: !drafting });
  }, [layout, drafting, theme]);
  useLayoutEffect(() => {
    if (colours.current === undefined) return;
    sheet.current?.light(layout, lit, colours.current);
    sheet.current?.look(view);
  }, [layout, lit, view, size, drafting, theme]);

  const walkSeams = (by: number) => {
    const count = draft.proof.seams.length;
    if (count === 0) return;
    const now = seamIndex(draft, state.seam);
    const next = now < 0 && by < 0 ? count - 1 : (now + by + count) % count;
    dispatch({ type: 'seam', seam: draft.proof.seams[next]?.first });
  };
  const middle = { x: size.width / 2, y: size.height / 2 };
  const press: Record<string, () => void> = {
    ArrowLeft: () => framing.pan({ x: 60, y: 0 }),
    ArrowRight: () => framing.pan({ x: -60, y: 0 }),
    ArrowUp: () => framing.pan({ x: 0, y: 60 }),
    ArrowDown: () => framing.pan({ x: 0, y: -60 }),
    '+': () => framing.zoom(1.25, middle),
    '=': () => framing.zoom(1.25, middle),
    '-': () => framing.zoom(0.8, middle),
    '0': () => framing.fit(layout.box, 'corner'),
    n: () => walkSeams(1),
    p: () => walkSeams(-1),
    Escape: () => dispatch({ type: 'seam', seam: undefined }),
  };

  const gestures = useGestures(frame, {
    pan: framing.pan,
    zoom: framing.zoom,
    point: (at, touch) => {
      const edge = sheet.current?.seamAt(
        toPaper(view, at),
        (touch ? reach.touch : reach.pointer) / view.scale,
      );
      if (edge?.piece !== state.seam?.piece || edge?.edge !== state.seam?.edge) {
        dispatch({ type: 'seam', seam: edge });
      }
    },
    leave: () => state.seam !== undefined && dispatch({ type: 'seam', seam: undefined }),
  });

  return (
    <div className="relative min-h-0 grow overflow-hidden">
      <div
        ref={frame}
        role="group"
        tabIndex={0}
        aria-label="Drawing of the pieces"
        aria-describedby="drawing-keys"
        className="group absolute inset-0 touch-none -outline-offset-2"
        onKeyDown={(event) => {
          const act = event.metaKey || event.ctrlKey || event.altKey ? undefined : press[event.key];
          if (act === undefined) return;
          event.preventDefault();
          act();
        }}
        {...gestures}
      >
        <canvas
          ref={canvas}
          className={`absolute inset-0 h-full w-full ${state.drawn.fresh ? '' : 'opacity-50'}`}
          aria-hidden="true"
        />
        <svg className="pointer-events-none absolute inset-0 h-full w-full">
          <Lettering draft={draft} layout={layout} view={view} size={size} named={!drafting} />
          {step !== undefined && <StepPoints step={step} layout={layout} view={view} />}
          {!drafting && (
            <Handles
              draft={draft}
              layout={layout}
              view={view}
              unit={state.unit}
              onMove={(handle, value) =>
                dispatch({ type: 'moved', field: `style.${handle}`, value })
              }
              onHold={setHeld}
            />
          )}
          <Rod view={view} size={size} unit={state.unit} />
        </svg>
        <p
          id="drawing-keys"
          className="absolute bottom-12 left-9 hidden rounded-one bg-cloth px-2 text-sm text-slate sm:group-focus-visible:block"
        >
          Arrow keys move, + and − zoom, 0 fits, N and P walk the seams, Tab reaches the handles
        </p>
      </div>
      {seam !== undefined && <SeamCallout seam={seam} layout={layout} view={view} size={size} />}
      <p role="status" className="sr-only">
        {seam !== undefined && `${seam.title}. ${seam.lines.join('; ')} ${state.unit}`}
      </p>
      <DrawingTools
        layout={layout}
        onFit={framing.fit}
        onZoom={(by) => framing.zoom(by, middle)}
        onSeam={walkSeams}
      />
    </div>
  );
});
