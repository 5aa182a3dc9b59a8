/**
 * Heights on the body figure as parts of its whole height, crown 0 to floor 1; the figure stands
 * eight heads tall, so these are a drawing convention and never a measure.
 */
export const figureHeights = {
  neck: 0.155,
  nape: 0.15,
  shoulder: 0.18,
  upperChest: 0.235,
  bust: 0.27,
  underbust: 0.31,
  waistSeam: 0.345,
  waist: 0.385,
  topHip: 0.435,
  hip: 0.49,
  knee: 0.72,
  floor: 1,
} as const;

/** A place on the figure: x from its centre line in figure heights (the reader's right is positive), y from the crown. */
export type FigurePoint = { readonly x: number; readonly y: number };

/** Where the tape goes on the body figure. */
export type Tape =
  | {
      /** Round the body (or round one limb, whose middle lies `off` the centre line) at a height. */
      readonly kind: 'girth';
      readonly view: 'front' | 'back';
      readonly at: number;
      readonly off?: number;
    }
  | {
      readonly kind: 'length';
      readonly view: 'front' | 'back';
      readonly through: readonly FigurePoint[];
    };

/** What a maker needs to take one measure and to trust it. */
export type Measure = {
  /** The trade's word, as the card shows it. */
  readonly label: string;
  /** Term of ISO 8559-1 where it has one, else the trade's full name. */
  readonly term: string;
  /** Clause of ISO 8559-1:2017, from memory: verify before printing it. */
  readonly isoNumberFromMemory?: string;
  /** How to take it, one sentence. */
  readonly how: string;
  /** Bounds outside which it is refused: millimetres, or degrees for an angle. */
  readonly min: number;
  readonly max: number;
  /** Two takings should agree within this; bench rule, common practice, no source. */
  readonly tolerance: number;
  readonly kind: 'length' | 'angle';
  readonly tape: Tape;
};
