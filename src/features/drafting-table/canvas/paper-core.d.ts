/**
 * The part of paper's core that the drafting table uses. paper's own declaration exports nothing
 * and brings the whole DOM along, so what is used is declared by hand.
 */
declare module 'paper/dist/paper-core.js' {
  export type Pair = readonly [number, number];
  export type SegmentParts = readonly [Pair, Pair?, Pair?];

  export type Style = {
    strokeColor?: string | null;
    fillColor?: string | null;
    strokeWidth?: number;
    strokeScaling?: boolean;
    dashArray?: readonly number[];
    strokeCap?: 'round' | 'butt';
    strokeJoin?: 'round' | 'miter';
    opacity?: number;
    data?: unknown;
    locked?: boolean;
  };

  export type Item = { readonly data: unknown; remove(): void };
  export type Layer = Item & { addChild(item: Item): void; removeChildren(): void };
  export type HitResult = { readonly item: Item };
  export type HitOptions = {
    stroke?: boolean;
    fill?: boolean;
    tolerance?: number;
    match?: (hit: HitResult) => boolean;
  };

  export type Matrix = object;
  export type View = {
    autoUpdate: boolean;
    viewSize: object;
    matrix: { set(a: number, b: number, c: number, d: number, tx: number, ty: number): void };
    update(): boolean;
    requestUpdate(): void;
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
    activate(): void;
    Path: new (parts: Style & { segments: readonly SegmentParts[]; closed?: boolean }) => Item;
    CompoundPath: new (
      parts: Style & {
        children: readonly Item[];
      },
    ) => Item;
    Layer: new () => Layer;
    Size: new (width: number, height: number) => object;
  }

  const paper: { readonly PaperScope: new () => PaperScope };
  export default paper;
}
