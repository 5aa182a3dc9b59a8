import { useId, useRef, useState, type KeyboardEvent } from 'react';

import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';
import type { Tile } from '#shared/sheets/tile-plan.ts';
import type { Unit } from '#shared/units/said.ts';

import { useSize } from '../../../lib/use-size.ts';
import { Rod, rodWidth } from '../../../ui/rod.tsx';
import { sheetBeside } from '../plan-picture.ts';
import { PlanDrawing } from './plan-drawing.tsx';

type PagePlanProps = {
  readonly plan: SheetPlan;
  readonly pieces: readonly FinishedPiece[];
  readonly unit: Unit;
  /** Another plan is on its way: this one can be looked at, not changed. */
  readonly passing: boolean;
  readonly onSheet: (name: string) => void;
};

/** Between rod and sheets, and after the last sheet, pixels. */
const corner = rodWidth + 6;
const rim = 8;

/** A sheet stays this wide at least: its name can be read and a finger meets it. */
const leastSheet = 34;

const ways: Readonly<Record<string, { readonly x: number; readonly y: number }>> = {
  ArrowRight: { x: 1, y: 0 },
  ArrowLeft: { x: -1, y: 0 },
  ArrowDown: { x: 0, y: 1 },
  ArrowUp: { x: 0, y: -1 },
};

/** Which sheet goes where, with the pieces over it; a sheet is left out, and taken back, where it lies. */
export const PagePlan = ({ plan, pieces, unit, passing, onSheet }: PagePlanProps) => {
  const frame = useRef<HTMLDivElement>(null);
  const sheets = useRef<HTMLDivElement>(null);
  const help = useId();
  const room = useSize(frame);
  const [standing, setStanding] = useState<string>();
  const { use, step, rows, columns, tiles } = plan.plan;
  const whole = {
    width: (columns - 1) * step.x + use.width,
    height: (rows - 1) * step.y + use.height,
  };
  const scale = Math.max(
    Math.min(
      (room.width - corner - rim) / whole.width,
      (room.height - corner - rim) / whole.height,
    ),
    leastSheet / Math.min(use.width, use.height),
  );
  const size = {
    width: Math.max(room.width, corner + whole.width * scale + rim),
    height: Math.max(room.height, corner + whole.height * scale + rim),
  };
  const stop = tiles.find(({ name }) => name === standing) ?? tiles[0];

  const walk = (event: KeyboardEvent, from: Tile) => {
    const way = ways[event.key];
    if (way === undefined) return;
    event.preventDefault();
    const next = sheetBeside(tiles, from, way);
    if (next === undefined) return;
    setStanding(next.name);
    sheets.current?.querySelector<HTMLElement>(`[data-sheet="${next.name}"]`)?.focus();
  };

  return (
    <div ref={frame} className="relative min-h-0 grow overflow-auto bg-cloth">
      {room.width > 0 && (
        <div className="relative" style={size}>
          <svg {...size} className="absolute inset-0" aria-hidden="true">
            <PlanDrawing plan={plan} pieces={pieces} scale={scale} corner={corner} />
            <Rod view={{ scale, x: corner, y: corner }} size={size} unit={unit} />
          </svg>
          <div
            ref={sheets}
            role="group"
            aria-label="Page plan"
            aria-describedby={help}
            className={passing ? 'pointer-events-none' : ''}
          >
            {tiles.map((tile) => {
              const { name, at, leftOut } = tile;
              return (
                <button
                  key={name}
                  type="button"
                  role="checkbox"
                  data-sheet={name}
                  aria-checked={leftOut !== true}
                  aria-label={`Sheet ${name}`}
                  disabled={passing}
                  tabIndex={tile === stop ? 0 : -1}
                  className="absolute rounded-one -outline-offset-2 not-disabled:hover:bg-brass/15"
                  style={{
                    left: corner + at.x * scale,
                    top: corner + at.y * scale,
                    width: use.width * scale,
                    height: use.height * scale,
                  }}
                  onFocus={() => setStanding(name)}
                  onClick={() => onSheet(name)}
                  onKeyDown={(event) => walk(event, tile)}
                />
              );
            })}
          </div>
          <p id={help} className="sr-only">
            Ticked sheets are printed. Walk with the arrow keys; Space leaves a sheet out or takes
            it back.
          </p>
        </div>
      )}
    </div>
  );
};
