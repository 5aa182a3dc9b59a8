import type { Construction, WantedGirth } from '../drafting/construction.ts';
import type { Dart, Edge, LevelLine, LevelName, Piece } from '../drafting/piece.ts';
import { crossingsOfLine, pathLength, pointAt } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, cross, distance, subtract, unit } from '../geometry/point.ts';
import { type Said, fine } from '../units/said.ts';
import { finding, missing, proofLine } from './finding.ts';
import type { Finding, GirthRow, ProofLine } from './proof.ts';
import { measureOpenings } from './top-openings.ts';

const bound = 0.5;
/** A corner this near a level line lies on it: the line may end in the very corner. */
const onTheLine = 0.01;

const levelTitles: { readonly [L in LevelName]: string } = {
  chest: 'Chest, under the arms',
  bust: 'Bust',
  underbust: 'Under-bust',
  'waist-seam': 'Waist seam',
  waist: 'Waist',
  'top-hip': 'Top hip',
  hip: 'Hip',
  'knee-seam': 'Knee seam',
  hem: 'Hem',
};

function meetings(paths: readonly Path[], { from, to }: LevelLine): readonly Point[] {
  const along = unit(subtract(to, from));
  const near = (p: Point): boolean => Math.abs(cross(along, subtract(p, from))) < onTheLine;
  const found: Point[] = [];
  for (const path of paths) {
    for (const segment of path) {
      if (near(segment.from)) found.push(segment.from);
      if (near(segment.to)) found.push(segment.to);
      for (const t of crossingsOfLine(segment, from, to)) found.push(pointAt(segment, t));
    }
  }
  return found;
}

const nearest = (to: Point, among: readonly Point[]): Point | undefined =>
  among.reduce<Point | undefined>(
    (best, each) => (best && distance(best, to) <= distance(each, to) ? best : each),
    undefined,
  );

function dartWidth(dart: Dart, level: LevelLine): number {
  const centre = nearest(level.from, meetings([dart.centreLeg], level));
  const side = nearest(level.to, meetings([dart.sideLeg], level));
  return centre && side ? Math.abs(side.x - centre.x) : 0;
}

/** Width of a piece along a level, where the outline meets it, less the darts there, mm. */
export function widthAtLevel(piece: Piece, level: LevelLine): number | undefined {
  const sewn = piece.edges.filter((edge) => edge.open !== true).map((edge) => edge.path);
  const places = meetings(sewn, level);
  const from = nearest(level.from, places);
  const to = nearest(level.to, places);
  if (from === undefined || to === undefined || from === to) return undefined;
  const taken = piece.darts.reduce((sum, dart) => sum + dartWidth(dart, level), 0);
  return Math.abs(to.x - from.x) - taken;
}

/** Pieces that no level of the body crosses: those inside, and the flare below. */
const isBeside = ({ part }: Piece): boolean => part === 'inner' || part === 'flare';

type Look = {
  readonly girth: number | undefined;
  readonly where: Finding['where'];
  readonly of: string;
};

/** Twice the widths of the pieces along a level, mm; no answer where a piece does not reach it. */
export function levelGirth(pieces: readonly Piece[], level: LevelName): Look {
  const where: { piece: string; at: Point }[] = [];
  let half: number | undefined = 0;
  for (const piece of pieces) {
    const line = piece.levels.find((each) => each.level === level);
    if (line === undefined || isBeside(piece)) continue;
    where.push({ piece: piece.name, at: line.to });
    const width = widthAtLevel(piece, line);
    half = half === undefined || width === undefined ? undefined : half + width;
  }
  return {
    girth: half === undefined || where.length === 0 ? undefined : 2 * half,
    where,
    of: 'pieces',
  };
}

const joinsPart = (edge: Edge, pieces: readonly Piece[], part: Piece['part']): boolean => {
  const { joins } = edge;
  if (joins === undefined || joins === 'self') return false;
  return pieces.some((each) => each.name === joins.piece && each.part === part);
};

function alongWaistEdges(pieces: readonly Piece[], own: 'top' | 'middle'): Look {
  const other = own === 'top' ? 'middle' : 'top';
  const edges = pieces
    .filter((piece) => piece.part === own)
    .flatMap((piece) =>
      piece.edges.filter((edge) => joinsPart(edge, pieces, other)).map((edge) => ({ piece, edge })),
    );
  const half = edges.reduce((sum, { edge }) => sum + pathLength(edge.path), 0);
  return {
    girth: edges.length === 0 ? undefined : 2 * half,
    where: edges.map(({ piece, edge }) => ({ piece: piece.name, edge: edge.name })),
    of: own === 'top' ? 'tops' : 'middles',
  };
}

/** Length of the hem all round: it is curved, so it is taped and not read across. */
function alongHem(pieces: readonly Piece[]): Look {
  const hems = pieces
    .filter(({ part, cloth }) => cloth === undefined && part !== 'sleeve' && part !== 'inner')
    .flatMap((piece) =>
      piece.edges.filter(({ kind }) => kind === 'hem').map((edge) => ({ piece, edge })),
    );
  const half = hems.reduce((sum, { edge }) => sum + pathLength(edge.path), 0);
  return {
    girth: hems.length === 0 ? undefined : 2 * half,
    where: hems.map(({ piece, edge }) => ({ piece: piece.name, edge: edge.name })),
    of: 'pieces',
  };
}

function acrossChest(pieces: readonly Piece[], construction: Construction): Look {
  const openings = measureOpenings(pieces, construction);
  const { front, back } = construction.chestSide;
  const half = openings.reduce<number | undefined>(
    (rest, { width }) => (rest === undefined || width === undefined ? undefined : rest - width),
    front + back,
  );
  return {
    girth: half === undefined ? undefined : 2 * half,
    where: openings.flatMap(({ asked }) => [asked.centre, asked.outer]),
    of: 'pieces',
  };
}

function looksAt(
  level: LevelName,
  pieces: readonly Piece[],
  construction: Construction,
): readonly Look[] {
  if (level === 'chest') return [acrossChest(pieces, construction)];
  if (level === 'hem') return [alongHem(pieces)];
  if (level === 'waist-seam') {
    return [alongWaistEdges(pieces, 'top'), alongWaistEdges(pieces, 'middle')];
  }
  return [levelGirth(pieces, level)];
}

function girthFinding(
  wanted: WantedGirth,
  { girth: cloth, where, of }: Look,
  gap: number,
): Finding {
  const title = levelTitles[wanted.level];
  if (cloth === undefined) return missing([`${title}: not found on the ${of}.`], where);
  const girth = cloth + gap;
  const asked: Said =
    wanted.body === undefined
      ? [`${title}: asked `, fine(wanted.wanted)]
      : [
          `${title}: body `,
          { mm: wanted.body },
          ...(wanted.ease === undefined ? [] : [' with ease ', { mm: wanted.ease }]),
          ' makes ',
          fine(wanted.wanted),
        ];
  return finding(
    girth,
    wanted.wanted,
    bound,
    [
      ...asked,
      `; the ${of} measure `,
      fine(cloth),
      ...(gap === 0 ? ['.'] : [' and the lacing gap ', fine(gap), '.']),
    ],
    where,
  );
}

/** Proof line 1 and the girth audit: flat widths less intakes, twice, against body and ease. */
export function proveGirths(
  pieces: readonly Piece[],
  construction: Construction,
): {
  readonly line: ProofLine;
  readonly rows: readonly GirthRow[];
  readonly chest: readonly Finding[];
} {
  const findings: Finding[] = [];
  const chest: Finding[] = [];
  const rows: GirthRow[] = [];
  for (const wanted of construction.wanted) {
    const own = looksAt(wanted.level, pieces, construction).map((look) =>
      girthFinding(wanted, look, construction.gaps?.[wanted.level] ?? 0),
    );
    findings.push(...own);
    if (wanted.level === 'chest') chest.push(...own);
    const worst = own.reduce((a, b) =>
      Math.abs(b.value - b.expected) > Math.abs(a.value - a.expected) ? b : a,
    );
    rows.push({ ...wanted, pieces: worst.value });
  }
  return { line: proofLine(1, 'Girths come out as body and ease', findings), rows, chest };
}
