import type { PartTable } from '../../drafting/drafting-table.ts';
import type { Edge, InnerLine, Piece } from '../../drafting/piece.ts';
import {
  endOf,
  pathCrossings,
  pathLength,
  reverse,
  splitPath,
  startOf,
  stationAtLength,
} from '../../geometry/curve.ts';
import { movedPath, shift } from '../../geometry/motion.ts';
import { type Path, line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { mm, said } from '../../units/said.ts';

/** Bones end this far short of a seam line, or of the line they stop at (reference.md 3d, common practice: 6 to 10). */
const short = 8;
/** A bone lies this far beside the seam it follows, in its casing. */
const beside = 5;
/** A panel wider than this at the under-bust has one more bone half way across (common practice, no source). */
const widePanel = 110;
/** Shorter is no bone. */
const leastBone = 60;

/** A bone: its place, how many are cut in all, and its length, mm. */
type Bone = {
  readonly piece: string;
  readonly line: InnerLine;
  readonly title: string;
  readonly count: number;
};

/** The part of a path above a height, from its upper end down; nothing where it lies below. */
function above(path: Path, y: number): Path {
  const [from, until] = [startOf(path), endOf(path)];
  if (!from || !until) return [];
  const down = from.y <= until.y ? path : reverse(path);
  const met = pathCrossings(down, point(0, y), point(1, y)).at(-1);
  if (met) return splitPath(down, met)[0];
  return Math.max(from.y, until.y) <= y ? down : [];
}

/** A path shortened at both ends, as far as it is long enough. */
function shortened(path: Path): Path {
  const length = pathLength(path);
  if (length < leastBone + 2 * short) return [];
  const foot = stationAtLength(path, length - short);
  const upper = foot && splitPath(path, foot)[0];
  const top = upper && stationAtLength(upper, short);
  return upper && top ? splitPath(upper, top)[1] : [];
}

const alongEdge = (edge: Edge, foot: number, towards: 1 | -1): Path =>
  movedPath(shortened(above(edge.path, foot)), shift(towards * beside, 0));

/** The upper edge and the foot of a piece at a distance from its centre line. */
function upright(piece: Piece, x: number, foot: number): Path {
  const met = piece.edges
    .flatMap(({ path }) => pathCrossings(path, point(x, 0), point(x, 1)))
    .map(({ at }) => at.y)
    .toSorted((a, b) => a - b);
  const [top] = met;
  const end = met.find((y) => y > (top ?? 0) + leastBone);
  if (top === undefined || end === undefined) return [];
  return shortened([line(point(x, top), point(x, Math.min(end, foot)))]);
}

const isUpper = ({ part, levels }: Piece): boolean =>
  part === 'top' && levels.some(({ level }) => level === 'bust');

function bonesOf(piece: Piece, waist: number): readonly Bone[] {
  const half = piece.side === 'front' ? 'front' : 'back';
  const bone = (name: string, title: string, path: Path, count = 2): readonly Bone[] =>
    path.length === 0
      ? []
      : [{ piece: piece.name, line: { name, kind: 'boning', path }, title, count }];
  const edgeNamed = (name: string): Edge | undefined =>
    piece.edges.find((edge) => edge.name === name);
  const across = piece.levels.find(({ level }) => level === 'underbust');
  const [from, until] = across ? [across.from.x, across.to.x] : [0, 0];
  const [princess, side, centre] = ['princess', 'side', 'centre'].map(edgeNamed);
  const inCentre = princess !== undefined && side === undefined;
  const onFold = centre?.kind === 'fold';
  return [
    // One of the two panels carries the bone of the seam between them.
    ...(princess && inCentre
      ? bone('bone-princess', `${half} princess seam`, alongEdge(princess, waist, -1))
      : []),
    ...(side && piece.side === 'front'
      ? bone('bone-side', 'side seam', alongEdge(side, waist, -1))
      : []),
    ...(centre && piece.side === 'back'
      ? bone('bone-centre', 'centre back', alongEdge(centre, waist, 1), onFold ? 1 : 2)
      : []),
    ...piece.darts
      .filter(({ name }) => name === 'waist')
      .flatMap((dart) =>
        bone(
          'bone-dart',
          `${half} dart`,
          upright(piece, (startOf(dart.centreLeg)?.x ?? 0) - beside, waist),
        ),
      ),
    ...(until - from > widePanel
      ? bone(
          `bone-half-way`,
          `${half}, half way across ${side ? 'the side' : 'the centre'}`,
          upright(piece, (from + until) / 2, waist),
        )
      : []),
  ];
}

/** The gown with its boning lines: along princess, side and centre back, and half way in wide panels. */
export function boneGown(
  paper: PartTable,
  pieces: readonly Piece[],
  waist: number,
): readonly Piece[] {
  const bones = pieces.filter(isUpper).flatMap((piece) => bonesOf(piece, waist));
  const laced = pieces.flatMap((piece) =>
    (piece.lines ?? []).filter(({ name }) => name.startsWith('bone-lacing')),
  );
  const list = bones.map(
    ({ title, count, line: { path } }) =>
      said`; ${title} ${String(count)} of ${mm(pathLength(path))}`,
  );
  const count = bones.reduce((sum, each) => sum + each.count, 0) + 2 * laced.length;
  paper.draw(
    'Boning',
    said`${String(count)} bones, each ending ${mm(short)} short of the seam lines${list.flat()}${laced.length === 0 ? '' : '; and one on either side of the eyelets, as long as their edges'}.`,
    {
      why: said`Bones hold the bodice up and its edge flat; over the bust they follow the seam and must be of the bending kind. Cap or bind every end and feel for it by hand inside the lining: an open end goes through cloth and skin.`,
      lines: bones.map(({ line: each }) => each.path),
    },
  );
  return pieces.map((piece) => {
    const own = bones.filter((each) => each.piece === piece.name).map((each) => each.line);
    return own.length === 0 ? piece : { ...piece, lines: [...(piece.lines ?? []), ...own] };
  });
}
