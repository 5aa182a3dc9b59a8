/** Heights of the body's levels in the half-body frame: millimetres below the side neck point. */
export type BodyLevels = {
  /** x of the side neck point and of the bust point, from the centre front. */
  readonly sideNeckX: number;
  readonly bustPointX: number;
  readonly bust: number;
  readonly underbust: number;
  /** The armpit line, where the upper chest is counted. */
  readonly underarm: number;
  readonly nape: number;
  readonly waist: number;
  readonly topHip: number;
  readonly hip: number;
  readonly knee: number;
  readonly floor: number;
};
