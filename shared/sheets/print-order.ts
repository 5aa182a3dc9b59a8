import type { Selection } from './selection.ts';

/** Papers by name: home sheets that are glued, large sheets, and rolls as long as the pieces need. */
export const sheetNames = [
  'A4',
  'A3',
  'Letter',
  'Legal',
  'Tabloid',
  'A1',
  'A0',
  'roll-36in',
  'roll-90cm',
] as const;
export type SheetName = (typeof sheetNames)[number];

/** A sheet of the maker's own, standing upright as typed; mm. */
export type CustomPaper = { readonly width: number; readonly height: number };

/** How sheets lie in the printer; `fewest` tries both and keeps portrait where they need as many. Rolls are never turned. */
export const orientations = ['portrait', 'landscape', 'fewest'] as const;
export type Orientation = (typeof orientations)[number];

/**
 * How a piece is drawn. `drawn once`: as drafted, to be cut as its label says. `mirrored pair`: it and its
 * mirror image, each cut from single cloth. `on fold` and `opened out` are for pieces with a fold: the half
 * with its fold marked, or both halves as one.
 */
export const drawnHow = ['drawn once', 'mirrored pair', 'on fold', 'opened out'] as const;
export type DrawnHow = (typeof drawnHow)[number];

/** One piece by its name in the draft, how it is drawn, and how often (a mirrored pair counts once). */
export type PieceOrder = {
  readonly piece: string;
  readonly copies: number;
  readonly how: DrawnHow;
};

/** `both` lines, the `finished` (seam) line alone, or the `cutting` line alone. */
export const lineChoices = ['both', 'finished', 'cutting'] as const;
export type LineChoice = (typeof lineChoices)[number];

/** True scale, or half and quarter scale for teaching: those say on every piece that they are not to be cut. */
export const printScales = [1, 0.5, 0.25] as const;
export type PrintScale = (typeof printScales)[number];

/** Everything a maker may choose about a print; the reader's unit comes beside it. Lengths in mm. */
export type PrintOrder = {
  readonly paper: SheetName | CustomPaper;
  readonly orientation: Orientation;
  /** White left round each sheet, where the printer cannot reach. */
  readonly margin: number;
  /** Width of the strip that two neighbouring sheets share. */
  readonly overlap: number;
  /** Lozenges on the strips, to lay sheet on sheet by. */
  readonly glueMarks: boolean;
  /** All pieces of a selection, each as drafted, or pieces one by one. */
  readonly pieces: Selection | readonly PieceOrder[];
  readonly lines: LineChoice;
  /** Thin lines, nothing filled, no pale sheet names. */
  readonly inkSaving: boolean;
  readonly scale: PrintScale;
  /** Sheets that are not printed, by name (`B3`); names of sheets the plan has not got are passed over. */
  readonly leftOut: readonly string[];
};

/** What is printed where nothing else is chosen. */
export const plainOrder: PrintOrder = {
  paper: 'A4',
  orientation: 'portrait',
  margin: 10,
  overlap: 10,
  glueMarks: true,
  pieces: 'whole-gown',
  lines: 'both',
  inkSaving: false,
  scale: 1,
  leftOut: [],
};

/**
 * Bounds of what is typed, mm and counts. The cover holds two test squares of 10 cm, so a custom sheet
 * is at least as wide as A4 and as long as Letter, whichever way it lies.
 */
export const orderLimits = {
  margin: { least: 5, most: 15 },
  overlap: { least: 5, most: 25 },
  shortSide: { least: 210, most: 1600 },
  longSide: { least: 275, most: 5000 },
  copies: { least: 1, most: 6 },
  /** Outlines laid on the sheets together, copies and both of a pair counted: more is printed in two goes. */
  drawings: 80,
} as const;

/** How far a long plan has come: moves made of all it may make, and the sheets it needs as it stands. */
export type PlanProgress = {
  readonly moves: number;
  readonly of: number;
  readonly sheets: number;
};

/**
 * How a plan is made. `onProgress` is called every few moves; `isCancelled` is asked as often, and where it
 * says yes the plan ends with `PlanCancelledError`. `effort: 'quick'` makes no moves: it answers in a few
 * hundredths of a second with at most a few sheets more, for a number beside a button.
 */
export type PlanWatch = {
  readonly onProgress?: (progress: PlanProgress) => void;
  readonly isCancelled?: () => boolean;
  readonly effort?: 'quick' | 'full';
};

/** The orders of the three old buttons: a selection on a home paper, all else plain. */
export const presetOrder = (paper: SheetName, pieces: Selection): PrintOrder => ({
  ...plainOrder,
  paper,
  pieces,
});
