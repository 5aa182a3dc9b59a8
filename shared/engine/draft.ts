import type { Body, MeasureCard } from '../body/card.ts';
import type { BodyLevels } from '../body/levels.ts';
import type { Construction, Handle } from '../drafting/construction.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece, LevelName } from '../drafting/piece.ts';
import type { Step } from '../drafting/step.ts';
import type { GownStyle, StyleCard } from '../drafts/gown/style-card.ts';
import type { Proof } from '../proof/proof.ts';
import type { Said } from '../units/said.ts';
import type { Problem } from '../units/problem.ts';

/** The three inputs of a gown; those saved before there were blocks name no garment. */
export type DraftInputs = {
  readonly garment?: 'gown' | undefined;
  readonly card: MeasureCard;
  readonly style: StyleCard;
  readonly rules: HouseRules;
};

/** A gown drafted, finished and proven. */
export type Draft = {
  readonly garment: 'gown';
  readonly engine: string;
  /** Short number printed on every piece, the same for the same inputs. */
  readonly number: string;
  readonly inputs: DraftInputs;
  readonly body: Body;
  readonly bodyLevels: BodyLevels;
  readonly style: GownStyle;
  /** y of each level in the half-body frame, millimetres below the side neck point. */
  readonly levels: { readonly [L in LevelName]: number };
  readonly pieces: readonly FinishedPiece[];
  readonly steps: readonly Step[];
  readonly handles: readonly Handle[];
  readonly construction: Construction;
  /** What the knee seam lets the wearer do, one sentence, and whether it is a caution. */
  readonly walking: { readonly step: number; readonly caution: boolean; readonly said: Said };
  readonly warnings: readonly Problem[];
  readonly proof: Proof;
};
