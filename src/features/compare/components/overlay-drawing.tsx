import { useMemo, useRef } from 'react';

import type { Comparison, PiecePair } from '#shared/compare/compare-drafts.ts';
import { type LevelFigure, levelFigures } from '#shared/compare/level-figures.ts';
import { morphAt, tracksOf } from '#shared/compare/morph.ts';
import { seamOutline } from '#shared/compare/moved-piece.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { dartLines, hatchApart, levelWords, regionData } from '#shared/exports/compare-svg.ts';
import { formatChange } from '#shared/exports/figure-words.ts';
import { layStacks } from '#shared/exports/overlaid.ts';
import { pathData } from '#shared/exports/path-data.ts';
import { hatch } from '#shared/geometry/region.ts';
import type { Point } from '#shared/geometry/point.ts';
import type { Unit } from '#shared/units/said.ts';

import { useSize } from '../../../lib/use-size.ts';

type OverlayDrawingProps = {
  readonly comparison: Comparison;
  readonly names: { readonly first: string; readonly second: string };
  readonly unit: Unit;
  /** From the first draft (0) to the second (1); none shows both alone. */
  readonly share: number;
  /** One piece by name, or all of them. */
  readonly only?: string | undefined;
};

const line = {
  fill: 'none',
  stroke: 'currentColor',
  vectorEffect: 'non-scaling-stroke',
  strokeLinejoin: 'round',
} as const;

/** Lettering of the levels, pixels on the screen. */
const lettering = 13;
/** From this scale on, pixels a millimetre, there is room for both widths; below, for what changes. */
const roomFrom = 0.8;
const roomForChange = 0.25;

/** What is written on a level at a scale: both widths, or their difference where there is one. */
function writtenAt(scale: number, figure: LevelFigure, unit: Unit): string {
  if (scale >= roomFrom) return levelWords(figure, unit);
  const change = formatChange('quarter', figure.second - figure.first, unit);
  return scale < roomForChange || change === '0' ? '' : change;
}

const Outline = ({ piece, dash }: { piece: FinishedPiece; dash?: string }) => (
  <>
    <path
      d={pathData(seamOutline(piece), true)}
      {...line}
      strokeWidth={1.5}
      strokeDasharray={dash}
    />
    <path d={dartLines(piece)} {...line} strokeWidth={1} strokeDasharray={dash} />
  </>
);

const Shading = ({ between }: { between: PiecePair['between'] | undefined }) => {
  const shades = useMemo(
    () =>
      between && [
        { region: between.first, strokes: hatch(between.first, 'falling', 2 * hatchApart) },
        { region: between.second, strokes: hatch(between.second, 'rising', 2 * hatchApart) },
      ],
    [between],
  );
  return shades?.map(({ region, strokes }, index) => (
    <g key={index} className="text-brass">
      <path d={regionData(region)} className="fill-level" fillRule="evenodd" />
      <path d={strokes.map((each) => pathData([each])).join('')} {...line} strokeWidth={0.8} />
    </g>
  ));
};

const chainData = (chain: readonly Point[]): string =>
  `M${chain.map(({ x, y }) => `${x} ${y}`).join('L')}`;

/** A pair on its way from one to the other: lines move, those without a partner fade. */
const Morph = ({ pair, share }: { pair: PiecePair; share: number }) => {
  const tracks = useMemo(() => tracksOf(pair), [pair]);
  return (
    <g className="text-brass">
      {morphAt(tracks, share).map(({ name, kind, chain, presence }) => (
        <path
          key={`${kind} ${name}`}
          d={chainData(chain)}
          opacity={presence}
          {...line}
          strokeWidth={kind === 'edge' ? 3 : 1.5}
        />
      ))}
    </g>
  );
};

/** Two drafts over each other: what each is, what lies between them, and the way from one to the other. */
export const OverlayDrawing = (props: OverlayDrawingProps) => {
  const { comparison, names, unit, share, only } = props;
  const holder = useRef<HTMLDivElement>(null);
  const size = useSize(holder);
  const laid = useMemo(() => {
    const pairs = comparison.pairs.filter(({ name }) => only === undefined || name === only);
    return layStacks(
      pairs.map((pair) => ({
        name: pair.name,
        pair,
        pieces: [pair.first, pair.second].flatMap((each) => each ?? []),
      })),
    );
  }, [comparison, only]);
  const figures = useMemo(() => levelFigures(comparison), [comparison]);
  const scale = size.width === 0 ? 0 : Math.min(size.width / laid.width, size.height / laid.height);
  return (
    <div
      ref={holder}
      className="max-h-[min(75dvh,48rem)] w-full"
      style={{ aspectRatio: laid.width / laid.height }}
    >
      <svg
        role="img"
        aria-label={`${names.first}, solid, and ${names.second}, dashed, over each other`}
        viewBox={`0 0 ${laid.width} ${laid.height}`}
        className="h-full w-full text-ink"
      >
        {laid.placed.map(({ stack: { pair }, translate }) => (
          <g key={pair.name} transform={`translate(${translate.x} ${translate.y})`}>
            <title>{pair.title}</title>
            <Shading between={pair.between} />
            {pair.first && <Outline piece={pair.first} />}
            {pair.second && <Outline piece={pair.second} dash="7 4" />}
            {share > 0 && <Morph pair={pair} share={share} />}
            {scale > 0 &&
              figures
                .filter(({ piece }) => piece === pair.name)
                .map((each) => (
                  <text
                    key={each.level}
                    x={each.at.x - 6 / scale}
                    y={each.at.y - 4 / scale}
                    fontSize={lettering / scale}
                    textAnchor="end"
                    className="halo fill-ink"
                    style={{ strokeWidth: 3 / scale }}
                  >
                    {writtenAt(scale, each, unit)}
                  </text>
                ))}
          </g>
        ))}
      </svg>
    </div>
  );
};
