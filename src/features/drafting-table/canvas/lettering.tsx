import type { Drafted } from '#shared/engine/drafted.ts';
import { levelTitles } from '#shared/exports/level-titles.ts';

import { rodWidth } from '../../../ui/rod.tsx';
import { isBody, type Layout } from './layout.ts';
import { pieceLabels, type PieceLabel } from './piece-labels.ts';
import { toScreen, type Size, type View } from './view.ts';

type LetteringProps = {
  readonly draft: Drafted;
  readonly layout: Layout;
  readonly view: View;
  readonly size: Size;
  /** Pieces lying one over the other, as they were drafted, are not named. */
  readonly named: boolean;
};

/** Names of levels and pieces, upright and the same size at every zoom. */
export const Lettering = ({ draft, layout, view, size, named }: LetteringProps) => {
  const stop = toScreen(view, { x: layout.levelsEnd, y: 0 }).x;
  const end = Math.min(size.width - 8, stop);
  // From afar a long name does not fit between the last piece and the end of its line.
  const room =
    end < stop
      ? Infinity
      : stop -
        Math.max(...bodies(layout).map(({ box }) => toScreen(view, { x: box.right, y: 0 }).x));
  return (
    <g aria-hidden="true">
      <g className="fill-brass text-[0.75rem]">
        {spaced(layout.levels.map((level) => ({ ...level, y: level.y * view.scale + view.y }))).map(
          ({ name, y }) =>
            y > rodWidth + 12 &&
            levelTitles[name].length * 6 < room &&
            y < size.height && (
              <text key={name} x={end} y={y - 4} textAnchor="end" className="halo">
                {levelTitles[name]}
              </text>
            ),
        )}
      </g>
      {named &&
        pieceLabels(layout, view, (piece) => faultOn(draft, piece)).map((label) => (
          <PieceName key={label.piece} label={label} />
        ))}
    </g>
  );
};

const bodies = ({ placed }: Layout): Layout['placed'] =>
  placed.filter(({ piece }) => isBody(piece));

const PieceName = ({ label }: { label: PieceLabel }) => {
  const { title, cut, fault, small, at, hairline } = label;
  const lines = [
    ...title.map((text) => ({ text, look: 'fill-ink font-semibold' })),
    ...(cut === undefined ? [] : [{ text: cut, look: 'fill-slate' }]),
    ...(fault === undefined ? [] : [{ text: fault, look: 'fill-madder font-semibold' }]),
  ];
  return (
    <>
      {hairline !== undefined && (
        <path
          d={`M${hairline.map(({ x, y }) => `${x} ${y}`).join('L')}`}
          className="fill-none stroke-slate"
          strokeWidth={0.75}
        />
      )}
      <text
        className={`halo ${small ? 'text-[0.6875rem]' : 'text-[0.8125rem]'}`}
        textAnchor="middle"
        x={at.x}
        y={at.y}
      >
        {lines.map(({ text, look }, index) => (
          <tspan key={text} className={look} x={at.x} dy={index === 0 ? 0 : '1.25em'}>
            {text}
          </tspan>
        ))}
      </text>
    </>
  );
};

/** The first line of the proof that fails on a piece, so that it stands beside the piece and not only in the table. */
function faultOn(draft: Drafted, piece: string): string | undefined {
  const failing = draft.proof.lines.find((line) =>
    line.findings.some((each) => !each.holds && each.where.some((at) => at.piece === piece)),
  );
  return failing && `proof ${failing.number} fails`;
}

/** Of names that would run into each other the upper one is kept. */
function spaced<T extends { readonly y: number }>(levels: readonly T[]): T[] {
  const kept: T[] = [];
  for (const level of [...levels].sort((a, b) => a.y - b.y)) {
    const above = kept.at(-1);
    if (above === undefined || level.y - above.y >= 15) kept.push(level);
  }
  return kept;
}
