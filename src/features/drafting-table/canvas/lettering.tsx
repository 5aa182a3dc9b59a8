import type { Draft } from '#shared/engine/draft.ts';

import type { Layout, Placed } from './layout.ts';
import { levelTitles } from '#shared/exports/level-titles.ts';
import { rodWidth } from './rod.tsx';
import { toScreen, type Size, type View } from './view.ts';

type LetteringProps = {
  readonly draft: Draft;
  readonly layout: Layout;
  readonly view: View;
  readonly size: Size;
  /** Pieces lying one over the other, as they were drafted, are not named. */
  readonly named: boolean;
};

/** Names of levels and pieces, upright and the same size at every zoom. */
export const Lettering = ({ draft, layout, view, size, named }: LetteringProps) => (
  <g aria-hidden="true">
    <g className="fill-brass text-[0.75rem]">
      {spaced(layout.levels.map((level) => ({ ...level, y: level.y * view.scale + view.y }))).map(
        ({ name, y }) =>
          y > rodWidth + 12 &&
          y < size.height && (
            <text key={name} x={size.width - 8} y={y - 4} textAnchor="end" className="halo">
              {levelTitles[name]}
            </text>
          ),
      )}
    </g>
    {named &&
      layout.placed.map((placed) => (
        <PieceName
          key={placed.piece.name}
          placed={placed}
          view={view}
          fault={faultOn(draft, placed.piece.name)}
        />
      ))}
  </g>
);

type PieceNameProps = {
  readonly placed: Placed;
  readonly view: View;
  readonly fault: number | undefined;
};

const PieceName = ({ placed: { piece, box }, view, fault }: PieceNameProps) => {
  const width = (box.right - box.left) * view.scale;
  if (width < 80) return null;
  const at = toScreen(view, {
    x: (box.left + box.right) / 2,
    y: box.top + (box.bottom - box.top) * (piece.part === 'middle' ? 0.45 : 0.5),
  });
  return (
    <text className="halo text-[0.8125rem]" textAnchor="middle" x={at.x} y={at.y}>
      <tspan className="fill-ink font-semibold" x={at.x}>
        {width < 150 ? shortTitle(piece.title) : piece.title}
      </tspan>
      {width >= 90 && (
        <tspan className="fill-slate" x={at.x} dy="1.3em">
          {piece.cut}
        </tspan>
      )}
      {fault !== undefined && (
        <tspan className="fill-madder font-semibold" x={at.x} dy="1.3em">
          {`proof ${fault} fails`}
        </tspan>
      )}
    </text>
  );
};

/** The first line of the proof that fails on a piece, so that it stands beside the piece and not only in the table. */
const faultOn = (draft: Draft, piece: string): number | undefined =>
  draft.proof.lines.find((line) =>
    line.findings.some((each) => !each.holds && each.where.some((at) => at.piece === piece)),
  )?.number;

/** `Front top, centre panel` on a narrow piece: what follows the comma. */
const shortTitle = (title: string): string => title.split(', ').at(-1) ?? title;

/** Of names that would run into each other the upper one is kept. */
function spaced<T extends { readonly y: number }>(levels: readonly T[]): T[] {
  const kept: T[] = [];
  for (const level of [...levels].sort((a, b) => a.y - b.y)) {
    const above = kept.at(-1);
    if (above === undefined || level.y - above.y >= 15) kept.push(level);
  }
  return kept;
}
