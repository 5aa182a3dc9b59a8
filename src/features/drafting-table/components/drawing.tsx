import { memo, useMemo, useRef, useState, type Dispatch } from 'react';

import type { Handle } from '#shared/drafting/construction.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { scale, type Point } from '#shared/geometry/point.ts';

import { useSize } from '../../../lib/use-size.ts';
import { useTheme } from '../../../lib/use-theme.ts';
import { Rod } from '../../../ui/rod.tsx';
import type { BenchAction } from '../bench.ts';
import { readColours } from '../canvas/colours.ts';
import { Handles } from '../canvas/handles.tsx';
import { asCut, asDrafted } from '../canvas/layout.ts';
import { Lettering } from '../canvas/lettering.tsx';
import { litLines } from '../canvas/lit-lines.ts';
import { pieceAt } from '../canvas/moved-pieces.ts';
import { StepPoints } from '../canvas/step-points.tsx';
import { TapeLine } from '../canvas/tape-line.tsx';
import { useDrag } from '../canvas/use-drag.ts';
import { useFraming } from '../canvas/use-framing.ts';
import { useGestures } from '../canvas/use-gestures.ts';
import { useMovedPieces } from '../canvas/use-moved-pieces.ts';
import { useSheet } from '../canvas/use-sheet.ts';
import { readingWords, useTape } from '../canvas/use-tape.ts';
import { aspectOf, toPaper } from '../canvas/view.ts';
import { drawingKey, keyWords } from '../drawing-keys.ts';
import { litSeam, seamIndex } from '../seams.ts';
import type { TableState } from '../table-state.ts';
import { DrawingTools } from './drawing-tools.tsx';
import { HeldPiece } from './held-piece.tsx';
import { SeamCallout } from './seam-callout.tsx';
import { TableTools, type Tool } from './table-tools.tsx';

type DrawingProps = {
  readonly draft: Drafted;
  readonly state: TableState;
  readonly place: string;
  readonly dispatch: Dispatch<BenchAction>;
  readonly onPrint: () => void;
};

/** Pixels within which a line counts as pointed at: a finger is broader than a pointer. */
const reach = { pointer: 7, touch: 18 };

/** A piece or the tape's crosshair is stepped by so many millimetres, with shift by ten times as many. */
const stride = 10;

/** The pieces on the canvas under the rod, with what is pointed at, handled or explained on top. */
export const Drawing = memo(function Drawing(props: DrawingProps) {
  const { draft, state, place, dispatch, onPrint } = props;
  const frame = useRef<HTMLDivElement>(null);
  const canvas = useRef<HTMLCanvasElement>(null);
  const dragged = useRef<HTMLCanvasElement>(null);
  const drag = useDrag(dragged, frame);
  const [chosenTool, setTool] = useState<Tool>('look');
  const [piece, setPiece] = useState<string>();
  const size = useSize(frame);
  const theme = useTheme();
  const drafting = state.panel === 'steps';
  const tool = drafting ? 'look' : chosenTool;
  const { pieces } = draft;
  const aspect = aspectOf(size);
  const asLaid = useMemo(
    () => (drafting ? asDrafted : asCut)(pieces, aspect),
    [drafting, pieces, aspect],
  );
  const moved = useMovedPieces(place, asLaid, !drafting);
  const { layout } = moved;
  const key = `${String(drafting)} ${pieces.map((each) => each.name).join()}`;
  // Framed by where the pieces lay: one that is carried off does not carry the view along.
  const framing = useFraming(key, asLaid.box, size);
  const { view } = framing;
  const tape = useTape(layout);

  const step = drafting ? draft.steps.find((each) => each.id === state.step) : undefined;
  const seam = useMemo(
    () => litSeam(draft, state.seam, state.unit),
    [draft, state.seam, state.unit],
  );
  const lit = useMemo(
    () => litLines(draft, layout, seam, step, state.looked),
    [draft, layout, seam, step, state.looked],
  );
  const sheet = useSheet(canvas, { layout, lit, view, size, allowances: !drafting, theme });

  const walkSeams = (by: number) => {
    const count = draft.proof.seams.length;
    if (count === 0) return;
    const now = seamIndex(draft, state.seam);
    const next = now < 0 && by < 0 ? count - 1 : (now + by + count) % count;
    dispatch({ type: 'seam', seam: draft.proof.seams[next]?.first });
  };
  const noSeam = () => state.seam !== undefined && dispatch({ type: 'seam', seam: undefined });
  const choose = (next: Tool) => {
    tape.clear();
    setPiece(undefined);
    noSeam();
    setTool(next);
    frame.current?.focus();
  };
  const walkPieces = (by: number) => {
    const names = layout.placed.map((each) => each.piece.name);
    const now = names.indexOf(piece ?? '');
    setPiece(names[(Math.max(now, by < 0 ? 0 : -1) + by + names.length) % names.length]);
  };
  const middle = { x: size.width / 2, y: size.height / 2 };
  const lookKeys = {
    pan: framing.pan,
    zoom: (by: number) => framing.zoom(by, middle),
    fit: () => framing.fit(layout.box, 'corner'),
    walkSeams,
    act: onPrint,
    letGo: noSeam,
  };
  const far = (by: Point, farther: boolean) => scale(by, farther ? stride * 10 : stride);
  const toolKeys = {
    look: undefined,
    move: {
      step: (by: Point, farther: boolean) =>
        piece !== undefined && moved.move(piece, far(by, farther)),
      walk: walkPieces,
      act: () => piece !== undefined && moved.snapBack(piece),
      letGo: () => choose('look'),
    },
    tape: {
      step: (by: Point, farther: boolean) =>
        tape.step(far(by, farther), reach.pointer / 2 / view.scale),
      walk: tape.walk,
      act: tape.holdHere,
      letGo: () => (tape.ends.length > 0 ? tape.clear() : choose('look')),
    },
  }[tool];

  const hold = (handle: Handle['key']) => {
    if (frame.current === null || draft.garment !== 'gown') return;
    drag.hold({
      inputs: draft.inputs,
      key: handle,
      shifts: moved.shifts,
      unit: state.unit,
      view,
      size,
      density: devicePixelRatio,
      colours: readColours(frame.current),
    });
  };
  const within = (touch: boolean) => (touch ? reach.touch : reach.pointer) / view.scale;
  const grabbed = useRef<string>(undefined);
  const gestures = useGestures(frame, {
    press: (at) => {
      grabbed.current = tool === 'move' ? pieceAt(layout, toPaper(view, at)) : undefined;
      if (tool === 'move') setPiece(grabbed.current);
    },
    pan: (by) =>
      grabbed.current === undefined
        ? framing.pan(by)
        : moved.move(grabbed.current, scale(by, 1 / view.scale)),
    zoom: framing.zoom,
    point: (at, touch) => {
      if (tool === 'tape') return tape.follow(toPaper(view, at), within(touch));
      if (tool === 'move') return;
      const edge = sheet.current?.seamAt(toPaper(view, at), within(touch));
      if (edge?.piece !== state.seam?.piece || edge?.edge !== state.seam?.edge) {
        dispatch({ type: 'seam', seam: edge });
      }
    },
    tap: tool === 'tape' ? (at, touch) => tape.hold(toPaper(view, at), within(touch)) : undefined,
    leave: noSeam,
  });
  const toolWords = tool === 'tape' ? tapeWords(tape, state.unit) : titleOf(draft, piece);

  return (
    <div className="relative min-h-0 grow overflow-hidden">
      <div
        ref={frame}
        role="group"
        tabIndex={0}
        aria-label="Drawing of the pieces"
        aria-describedby="drawing-keys"
        className="group absolute inset-0 touch-none outline-none"
        onKeyDown={(event) => {
          if (event.metaKey || event.ctrlKey || event.altKey) return;
          // A handle in the hand is no place to print from.
          if (event.key === 'Enter' && event.target !== event.currentTarget) return;
          const act = drawingKey(event, lookKeys, toolKeys);
          if (act === undefined) return;
          event.preventDefault();
          act();
        }}
        {...gestures}
      >
        <canvas
          ref={canvas}
          className={`absolute inset-0 h-full w-full group-data-dragging:invisible ${state.drawn.fresh ? '' : 'opacity-50'}`}
          aria-hidden="true"
        />
        <canvas
          ref={dragged}
          className="pointer-events-none invisible absolute inset-0 h-full w-full will-change-transform group-data-dragging:visible"
          aria-hidden="true"
        />
        <svg className="pointer-events-none absolute inset-0 h-full w-full">
          <Lettering draft={draft} layout={layout} view={view} size={size} named={!drafting} />
          {step !== undefined && <StepPoints step={step} layout={layout} view={view} />}
          {tool === 'look' && !drafting && draft.garment === 'gown' && (
            <Handles
              draft={draft}
              layout={layout}
              view={view}
              unit={state.unit}
              onMove={(handle, value) =>
                dispatch({ type: 'moved', field: `style.${handle}`, value })
              }
              onHold={hold}
              onDrag={drag.to}
              onDrop={drag.letGo}
              onRelease={() => dispatch({ type: 'released' })}
            />
          )}
          {tool === 'tape' && (
            <TapeLine ends={tape.ends} cursor={tape.cursor} view={view} unit={state.unit} />
          )}
          {tool === 'move' && <HeldPiece piece={piece} layout={layout} view={view} />}
          <Rod view={view} size={size} unit={state.unit} />
        </svg>
        <span className="pointer-events-none absolute inset-0 hidden border-2 border-brass group-focus-visible:block" />
        <p
          id="drawing-keys"
          className="absolute bottom-13 left-9 hidden rounded-one bg-cloth px-2 text-sm text-slate sm:group-focus-visible:block"
        >
          {keyWords[tool]}
        </p>
      </div>
      {seam !== undefined && <SeamCallout seam={seam} layout={layout} view={view} size={size} />}
      <p role="status" className="sr-only">
        {seam !== undefined && `${seam.title}. ${seam.lines.join('; ')} ${state.unit}`}
      </p>
      <p role="status" className="sr-only">
        {toolWords}
      </p>
      <div className="pointer-events-none absolute right-2 bottom-2 left-9 flex flex-wrap-reverse items-end justify-end gap-2 *:pointer-events-auto sm:justify-between">
        {!drafting && (
          <TableTools
            tool={tool}
            moved={moved.any}
            onTool={choose}
            onSnapBack={() => {
              moved.snapBack();
              frame.current?.focus();
            }}
          />
        )}
        <DrawingTools
          layout={layout}
          onFit={framing.fit}
          onZoom={(by) => framing.zoom(by, middle)}
          onSeam={walkSeams}
        />
      </div>
    </div>
  );
});

const titleOf = (draft: Drafted, piece: string | undefined): string =>
  draft.pieces.find(({ name }) => name === piece)?.title ?? '';

/** Where the tape is held and what it reads, for who does not see it. */
function tapeWords({ ends, cursor }: ReturnType<typeof useTape>, unit: TableState['unit']): string {
  const [first, second] = ends;
  if (first !== undefined && second !== undefined) return readingWords(first, second, unit);
  const at = cursor?.words ?? (cursor === undefined ? '' : 'on the bare paper');
  if (first === undefined || cursor === undefined) return at;
  return `${at}: ${readingWords(first, cursor, unit)}`;
}
