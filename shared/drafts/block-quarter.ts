import type { Body, MeasureKey } from '../body/card.ts';
import type { BalanceLevel, HouseRules } from '../drafting/house-rules.ts';
import type { Side } from '../drafting/piece.ts';
import { type Quantity, plus, quarterOf, taken } from '../drafting/quantity.ts';

/** A level of a block: the girth it is drawn from, its ease and the balance that moves its side seam. */
export type BlockLevel = {
  readonly name: string;
  readonly girth: MeasureKey;
  readonly ease: number;
  readonly balance: BalanceLevel;
};

/** Finished quarter of a block (method section 4): (girth + ease)/4, plus the balance in front, less it behind; mm. */
export const blockQuarter = (
  side: Side,
  body: Body,
  rules: HouseRules,
  { name, girth, ease, balance }: BlockLevel,
): Quantity =>
  plus(
    quarterOf(
      plus(taken(name, girth, body.measures[girth], girth in body.estimated), 'ease', ease),
    ),
    'balance',
    (side === 'front' ? 1 : -1) * rules.balance[balance],
  );
