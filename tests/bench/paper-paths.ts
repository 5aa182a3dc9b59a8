import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { Path } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';

type PaperPath = {
  moveTo(to: object): void;
  lineTo(to: object): void;
  cubicCurveTo(c1: object, c2: object, to: object): void;
};

/** The little of paper's core that is needed to draw outlines: its own declaration exports nothing. */
type PaperCore = {
  readonly Point: new (x: number, y: number) => object;
  readonly Size: new (width: number, height: number) => object;
  readonly CompoundPath: new (options: { readonly insert: false }) => PaperPath;
  setup(size: object): void;
};

/** What the package gives as its default export, seen with the types above. */
const asPaper = (loaded: unknown): { readonly default: PaperCore } =>
  loaded as { readonly default: PaperCore };

/** The name is kept from the compiler, which would look for declarations that are not there. */
const paperCore: string = 'paper/dist/paper-core.js';

/** Draws the outlines of pieces as plain paper paths, seam lines and cutting lines, nothing else. */
export async function paperDrawing(): Promise<(pieces: readonly FinishedPiece[]) => number> {
  const { default: paper } = asPaper(await import(paperCore));
  paper.setup(new paper.Size(1, 1));
  const at = ({ x, y }: Point): object => new paper.Point(x, y);
  const draw = (path: Path): void => {
    const drawn = new paper.CompoundPath({ insert: false });
    path.forEach((segment, index) => {
      if (index === 0) drawn.moveTo(at(segment.from));
      if (segment.kind === 'line') drawn.lineTo(at(segment.to));
      else drawn.cubicCurveTo(at(segment.c1), at(segment.c2), at(segment.to));
    });
  };
  return (pieces) => {
    let drawn = 0;
    for (const { edges, darts, cutLine } of pieces) {
      const lines = [
        ...edges.map((edge) => edge.path),
        ...darts.flatMap((dart) => [dart.centreLeg, dart.sideLeg]),
        cutLine,
      ];
      for (const line of lines) draw(line);
      drawn += lines.length;
    }
    return drawn;
  };
}
