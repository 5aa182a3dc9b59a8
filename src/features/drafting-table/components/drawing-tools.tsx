import type { Layout } from '../canvas/layout.ts';
import type { Box, Place } from '../canvas/view.ts';

type DrawingToolsProps = {
  readonly layout: Layout;
  readonly onFit: (box: Box, place: Place) => void;
  readonly onZoom: (by: number) => void;
  readonly onSeam: (by: number) => void;
};

const tool =
  'min-h-9 rounded-one px-2 max-sm:min-h-11 max-sm:min-w-11 pointer-coarse:min-h-11 pointer-coarse:min-w-11 hover:bg-cloth';

/** Looking about on the drawing: fit, nearer, further, one piece, seam after seam. */
export const DrawingTools = ({ layout, onFit, onZoom, onSeam }: DrawingToolsProps) => (
  <div
    role="toolbar"
    aria-label="Look about"
    className="ml-auto flex items-center rounded-one border border-rule bg-ground text-sm"
  >
    <button type="button" className={tool} onClick={() => onFit(layout.box, 'corner')}>
      Fit
    </button>
    <button
      type="button"
      className={`${tool} max-sm:hidden`}
      aria-label="Further"
      onClick={() => onZoom(0.8)}
    >
      −
    </button>
    <button
      type="button"
      className={`${tool} max-sm:hidden`}
      aria-label="Nearer"
      onClick={() => onZoom(1.25)}
    >
      +
    </button>
    <select
      aria-label="Zoom to a piece"
      className={`${tool} max-w-18 sm:max-w-24 bg-ground`}
      value=""
      onChange={(event) => {
        const chosen = layout.placed.find(({ piece }) => piece.name === event.currentTarget.value);
        if (chosen !== undefined) onFit(chosen.box, 'middle');
      }}
    >
      <option value="">Piece…</option>
      {layout.placed.map(({ piece }) => (
        <option key={piece.name} value={piece.name}>
          {piece.title}
        </option>
      ))}
    </select>
    <button type="button" className={tool} aria-label="Seam before" onClick={() => onSeam(-1)}>
      ‹
    </button>
    <span className="text-slate max-sm:hidden">Seam</span>
    <button type="button" className={tool} aria-label="Seam after" onClick={() => onSeam(1)}>
      ›
    </button>
  </div>
);
