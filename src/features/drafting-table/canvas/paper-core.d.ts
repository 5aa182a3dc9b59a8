/**
 * The part of paper's core that the drafting table uses. paper's own declaration exports nothing
 * and brings the whole DOM along, so what is used is declared by hand.
 */
declare module 'paper/dist/paper-core.js' {
  export type Pair = readonly [number, number];
  export type SegmentParts = readonly [Pair, Pair?, Pair?];

  export type Item = {
    data: unknown;
    closed: boolean;
    strokeColor: string;
    fillColor: string;
    strokeWidth: number;
    strokeScaling: boolean;
    strokeJoin: 'round' | 'miter';
    dashArray: readonly number[];
  };
  export type Layer = Item & { addChild(item: Item): void; removeChildren(): void };
  export type HitResult = { readonly item: Item };
  export type HitOptions = {
    stroke?: boolean;
    tolerance?: number;
    match?: (hit: HitResult) => boolean;
  };

  export type View = {
    autoUpdate: boolean;
    viewSize: object;
    matrix: { set(a: number, b: number, c: number, d: number, tx: number, ty: number): void };
    update(): boolean;
    remove(): void;
  };
  export type Project = {
    hitTestAll(at: Pair, options: HitOptions): HitResult[];
    remove(): void;
  };

  export class PaperScope {
    settings: { insertItems: boolean; applyMatrix: boolean };
    view: View;
    project: Project;
    setup(canvas: HTMLCanvasElement): void;
    Path: new (segments: readonly SegmentParts[]) => Item;
    CompoundPath: new (children: readonly Item[]) => Item;
    Layer: new () => Layer;
    Size: new (width: number, height: number) => object;
  }

  const paper: { readonly PaperScope: new () => PaperScope };
  export default paper;
}
