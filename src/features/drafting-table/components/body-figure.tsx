import { figureHeights as at, type Tape } from '#shared/body/measure.ts';

/** The figure is drawn 400 units tall; BODY's heights are parts of that. */
const tall = 400;

/** Half widths of the figure from the crown down, in parts of its height: a drawing, not a body. */
const silhouette: readonly (readonly [height: number, half: number])[] = [
  [at.neck - 0.03, 0.024],
  [at.neck, 0.027],
  [0.168, 0.055],
  [at.shoulder, 0.098],
  [0.2, 0.108],
  [at.upperChest, 0.086],
  [at.bust, 0.089],
  [at.underbust, 0.077],
  [at.waistSeam, 0.069],
  [at.waist, 0.066],
  [at.topHip, 0.085],
  [at.hip, 0.099],
  [0.56, 0.094],
  [at.knee, 0.064],
  [0.8, 0.062],
  [0.95, 0.036],
  [0.985, 0.042],
];

type Spot = readonly [x: number, y: number];

/** A calm curve through places: each stretch leans on its neighbours. */
function curveThrough(spots: readonly Spot[]): string {
  return spots
    .map(([x, y], index) => {
      if (index === 0) return `M${x} ${y}`;
      const [a, b, d] = [spots[index - 2] ?? spots[index - 1], spots[index - 1], spots[index + 1]];
      if (a === undefined || b === undefined) return '';
      const after = d ?? [x, y];
      const c1 = [b[0] + (x - a[0]) / 6, b[1] + (y - a[1]) / 6];
      const c2 = [x - (after[0] - b[0]) / 6, y - (after[1] - b[1]) / 6];
      return `C${c1.map(short).join(' ')} ${c2.map(short).join(' ')} ${short(x)} ${short(y)}`;
    })
    .join('');
}

const short = (value: number): string => value.toFixed(1);

const outline = (way: 1 | -1): string =>
  curveThrough(silhouette.map(([y, half]): Spot => [way * half * tall, y * tall]));

const arm = (way: 1 | -1): string =>
  [
    curveThrough([
      [way * 0.108 * tall, 0.2 * tall],
      [way * 0.134 * tall, 0.26 * tall],
      [way * 0.15 * tall, 0.37 * tall],
      [way * 0.163 * tall, 0.47 * tall],
      [way * 0.166 * tall, 0.53 * tall],
    ]),
    curveThrough([
      [way * 0.087 * tall, 0.237 * tall],
      [way * 0.117 * tall, 0.32 * tall],
      [way * 0.126 * tall, 0.38 * tall],
      [way * 0.143 * tall, 0.47 * tall],
      [way * 0.152 * tall, 0.53 * tall],
    ]),
  ].join('');

const legs = curveThrough([
  [0, 0.53 * tall],
  [0.008 * tall, 0.62 * tall],
  [0.014 * tall, at.knee * tall],
  [0.012 * tall, 0.8 * tall],
  [0.016 * tall, 0.95 * tall],
]);

const figure = [
  `M0 0C${short(0.045 * tall)} 0 ${short(0.043 * tall)} ${short(0.125 * tall)} 0 ${short(0.125 * tall)}`,
  `C${short(-0.043 * tall)} ${short(0.125 * tall)} ${short(-0.045 * tall)} 0 0 0`,
  outline(1),
  outline(-1),
  arm(1),
  arm(-1),
  legs,
].join('');

const otherLeg = legs.replaceAll(/(^M|C| )(\d[\d.]*) (\d[\d.]*)/g, '$1-$2 $3');

/** Half width of the figure at a height, between the heights it is drawn by. */
function halfAt(height: number): number {
  const below = silhouette.findIndex(([y]) => y >= height);
  const [lower, upper] = [silhouette[below], silhouette[below - 1]];
  if (lower === undefined) return 0.04;
  if (upper === undefined) return lower[1];
  return upper[1] + ((lower[1] - upper[1]) * (height - upper[0])) / (lower[0] - upper[0]);
}

/** Width of one knee, arm or wrist on the figure. */
const limbHalf = 0.026;

function tapePath(tape: Tape): string {
  if (tape.kind === 'length') {
    return curveThrough(tape.through.map(({ x, y }): Spot => [x * tall, y * tall]));
  }
  const half = (tape.off === undefined ? halfAt(tape.at) : limbHalf) * tall;
  const middle = (tape.off ?? 0) * tall;
  const y = tape.at * tall;
  const sag = half * 0.3;
  return `M${short(middle - half)} ${short(y)}Q${short(middle)} ${short(y + sag)} ${short(middle + half)} ${short(y)}Q${short(middle)} ${short(y - sag)} ${short(middle - half)} ${short(y)}`;
}

type BodyFigureProps = { readonly tape: Tape | undefined; readonly label: string };

/** Our own body figure, with the tape of the measure in hand lit on it. */
export const BodyFigure = ({ tape, label }: BodyFigureProps) => (
  <svg
    viewBox="-76 -6 152 412"
    className="h-30 shrink-0 lg:h-40"
    role="img"
    aria-label={
      tape === undefined
        ? 'Body figure'
        : `Body figure from the ${tape.view}, with the tape at: ${label}`
    }
  >
    <path d={figure} className="fill-none stroke-slate" strokeWidth={3.5} />
    <path d={otherLeg} className="fill-none stroke-slate" strokeWidth={3.5} />
    {tape !== undefined && (
      <path
        d={tapePath(tape)}
        className="fill-none stroke-brass"
        strokeWidth={7}
        strokeLinecap="round"
      />
    )}
    {tape !== undefined && (
      <text x={-74} y={402} className="fill-slate text-[1.625rem]">
        {tape.view}
      </text>
    )}
  </svg>
);
