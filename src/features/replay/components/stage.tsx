import { memo, useMemo, useRef } from 'react';

import { pathData } from '#shared/exports/path-data.ts';
import { spread } from '#shared/exports/spread.ts';
import { stepPicture, type StepPicture } from '#shared/lesson/step-picture.ts';
import type { Told } from '#shared/lesson/told.ts';
import type { Box } from '#shared/sheets/layout.ts';

import { useSize } from '../../../lib/use-size.ts';
import { placeNames } from '#shared/lesson/place-names.ts';
import { useLook } from '../use-look.ts';

type StageProps = {
  readonly told: Told;
  readonly place: number;
  /** All of the frame, rather than where the step is. */
  readonly whole: boolean;
  /** Heavier lines and larger letters, for the back of a room. */
  readonly far: boolean;
  readonly label: string;
  /** The draft beside it: both are seen at one scale, and each says whose it is. */
  readonly other?: { readonly told: Told; readonly place: number } | undefined;
};

/** Room about the drawing, pixels. */
const rim = 14;

const centreNames = {
  front: 'centre front',
  back: 'centre back',
  flare: 'centre',
  pieces: '',
} as const;

/** The drawing of a step: what was there before as hairlines, what is new drawn in, its points lit. */
export const Stage = memo(function Stage(props: StageProps) {
  const { told, place, whole, far, label, other } = props;
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const picture = useMemo(() => stepPicture(told, place), [told, place]);
  const laid = useMemo(() => spread(picture?.laid ?? []), [picture]);
  const beside = useMemo(() => other && stepPicture(other.told, other.place), [other]);
  const wanted = asLargeAs(
    wantedLook(picture, whole, laid),
    beside && wantedLook(beside, whole, spread(beside.laid)),
  );
  const look = useLook(wanted, picture?.frame ?? 'pieces');
  if (picture === undefined) return null;
  const inner = {
    width: Math.max(40, size.width - 2 * rim),
    height: Math.max(40, size.height - 2 * rim),
  };
  const scale = Math.min(inner.width / look.width, inner.height / look.height);
  const left = (size.width - look.width * scale) / 2 - look.x * scale;
  const top = (size.height - look.height * scale) / 2 - look.y * scale;
  const px = 1 / scale;
  const weight = far ? 2 : 1;
  const letters = far ? Math.max(20, size.height / 26) : 14;
  const names = placeNames(
    picture.points,
    ({ x, y }) => ({ x: left + x * scale, y: top + y * scale }),
    // Below stands whose centre line it is.
    { width: size.width, height: size.height - letters * 1.3, letters },
  );
  const id = told.steps[place]?.id ?? '';
  return (
    <div ref={frame} className="relative h-full min-h-0 min-w-0 overflow-hidden">
      {other !== undefined && (
        <p className={`absolute top-1 right-3 text-slate ${far ? 'text-xl' : 'text-sm'}`}>
          {label}
        </p>
      )}
      {size.width > 0 && (
        <svg
          role="img"
          aria-label={`${label}: ${altOf(told, place, picture)}`}
          className="absolute inset-0 h-full w-full"
        >
          <g
            transform={`translate(${left} ${top}) scale(${scale})`}
            fill="none"
            strokeLinecap="round"
            strokeLinejoin="round"
          >
            {picture.frame === 'pieces' ? (
              <Pieces laid={laid} id={id} line={1.8 * weight * px} />
            ) : (
              <>
                <path
                  className="stroke-slate"
                  strokeWidth={0.9 * weight * px}
                  strokeDasharray={`${9 * px} ${4 * px} ${2 * px} ${4 * px}`}
                  d={`M0 ${look.y - look.height}V${look.y + 2 * look.height}`}
                />
                {picture.cut.map(({ piece }) => (
                  <g key={piece.name}>
                    <path
                      className="fill-paper stroke-ink"
                      strokeWidth={1.5 * weight * px}
                      d={pathData(
                        piece.edges.flatMap((edge) => edge.path),
                        true,
                      )}
                    />
                    <path
                      className="stroke-ink"
                      strokeWidth={0.9 * weight * px}
                      d={piece.darts
                        .flatMap((dart) => [dart.centreLeg, dart.sideLeg])
                        .map((leg) => pathData(leg))
                        .join('')}
                    />
                  </g>
                ))}
                <path
                  className="stroke-slate"
                  strokeWidth={0.8 * weight * px}
                  d={picture.before.map((path) => pathData(path)).join('')}
                />
                {picture.now.map((path, index) => (
                  <path
                    key={`${id} ${String(index)}`}
                    className="draw-in stroke-brass"
                    style={{ animationDelay: `${String(200 + index * 180)}ms` }}
                    strokeWidth={3 * weight * px}
                    pathLength={1}
                    d={pathData(path)}
                  />
                ))}
              </>
            )}
          </g>
          {picture.frame !== 'pieces' && (
            <>
              {picture.points.map(({ name, at, now }, index) => (
                <circle
                  key={`${name} ${String(index)}`}
                  cx={left + at.x * scale}
                  cy={top + at.y * scale}
                  r={(now ? 4.5 : 2) * (far ? 1.5 : 1)}
                  className={now ? 'fill-brass' : 'fill-slate'}
                />
              ))}
              {names.map(({ name, x, y, anchor, now }) => (
                <text
                  key={name}
                  x={x}
                  y={y}
                  textAnchor={anchor}
                  fontSize={now ? letters : letters * 0.86}
                  className={`halo-ground ${now ? 'fill-brass font-semibold' : 'fill-slate'}`}
                >
                  {name}
                </text>
              ))}
              <text
                x={Math.max(6, left - 6)}
                y={size.height - 8}
                fontSize={letters * 0.86}
                textAnchor={left > 90 ? 'end' : 'start'}
                className="halo-ground fill-slate"
              >
                {centreNames[picture.frame]}
              </text>
            </>
          )}
        </svg>
      )}
    </div>
  );
});

type Extent = { readonly width: number; readonly height: number };

const wantedLook = (picture: StepPicture | undefined, whole: boolean, laid: Extent): Box => {
  if (picture === undefined || picture.frame === 'pieces') {
    return { x: 0, y: 0, width: laid.width, height: laid.height };
  }
  return whole ? picture.whole : picture.near;
};

/** A look grown about its middle to another's size, so that two bodies are seen at one scale. */
const asLargeAs = ({ x, y, width, height }: Box, other: Extent = { width, height }): Box => {
  const [w, h] = [Math.max(width, other.width), Math.max(height, other.height)];
  return { x: x - (w - width) / 2, y: y - (h - height) / 2, width: w, height: h };
};

const frameWords = {
  front: 'front half',
  back: 'back half',
  flare: 'flare',
  pieces: 'pieces',
} as const;

function altOf({ steps }: Told, place: number, { frame, now, points, laid }: StepPicture): string {
  const named = points.filter((each) => each.now).map(({ name }) => name);
  if (frame === 'pieces') return `${steps[place]?.title ?? ''}, ${String(laid.length)} pieces`;
  const lines = now.length === 1 ? '1 new line' : `${String(now.length)} new lines`;
  const lit = named.length === 0 ? '' : `; points ${named.join(', ')}`;
  return `${steps[place]?.title ?? ''}, ${frameWords[frame]}, ${lines}${lit}`;
}

type PiecesProps = {
  readonly laid: ReturnType<typeof spread>;
  readonly id: string;
  readonly line: number;
};

/** All pieces apart: the cutting line drawn in outside the dashed seam line. */
const Pieces = ({ laid, id, line }: PiecesProps) => (
  <>
    {laid.placed.map(({ piece, translate }, index) => (
      <g key={piece.name} transform={`translate(${translate.x} ${translate.y})`}>
        <path className="fill-paper" d={pathData(piece.cutLine, true)} />
        <path
          className="stroke-slate"
          strokeWidth={line * 0.6}
          strokeDasharray={`${String(line * 4)} ${String(line * 2.5)}`}
          d={[
            ...piece.edges.map((edge) => edge.path),
            ...piece.darts.flatMap((dart) => [dart.centreLeg, dart.sideLeg]),
          ]
            .map((path) => pathData(path))
            .join('')}
        />
        <path
          key={id}
          className="draw-in stroke-ink"
          style={{ animationDelay: `${String(200 + index * 120)}ms` }}
          strokeWidth={line}
          pathLength={1}
          d={pathData(piece.cutLine, true)}
        />
      </g>
    ))}
  </>
);
