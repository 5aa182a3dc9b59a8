import type { LevelName } from '../drafting/piece.ts';
import type { Point } from '../geometry/point.ts';
import type { Said } from '../units/said.ts';

/** One place the proof looked at: what was measured there, and what it had to be. */
export type Finding = {
  readonly holds: boolean;
  /** Nothing was compared: it is said for the maker to know. */
  readonly reported?: true;
  /** In plain words, with the numbers: `Side seam: front 565.2, back 565.2`. */
  readonly said: Said;
  readonly value: number;
  readonly expected: number;
  readonly bound: number;
  /** Piece and, where it fits, edge names looked at. */
  readonly where: readonly {
    readonly piece: string;
    readonly edge?: string;
    readonly at?: Point;
  }[];
};

/** A line of method section 8, with all it looked at. */
export type ProofLine = {
  readonly number: 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8;
  readonly title: string;
  readonly holds: boolean;
  readonly findings: readonly Finding[];
};

/** One row of the girth audit, whole-body millimetres. The knee seam has no body girth. */
export type GirthRow = {
  readonly level: LevelName;
  readonly body?: number;
  readonly ease?: number;
  readonly wanted: number;
  readonly pieces: number;
  readonly estimated: boolean;
};

/** A seam walked: both lengths side by side. */
export type SeamRow = {
  readonly title: string;
  readonly first: { readonly piece: string; readonly edge: string; readonly length: number };
  readonly second: { readonly piece: string; readonly edge: string; readonly length: number };
  readonly ease: number;
  readonly holds: boolean;
};

export type Proof = {
  readonly holds: boolean;
  /** The verdict, one sentence. */
  readonly verdict: Said;
  readonly lines: readonly ProofLine[];
  readonly girths: readonly GirthRow[];
  readonly seams: readonly SeamRow[];
};
