import type { HouseRules } from '#shared/drafting/house-rules.ts';
import {
  isOffShoulder,
  styleChoices,
  type StyleChoice,
  type StyleChoices,
  type StyleLength,
} from '#shared/drafts/gown/style-card.ts';

import { intakeFields, type FieldKey } from './fields.ts';

/** Every choice of a style card, made. */
export type MadeChoices = { readonly [C in StyleChoice]: StyleChoices[C][number] };

/** `keys` forgets which ones an object has. */
const keysOf = <K extends string>(of: { readonly [key in K]?: unknown }): readonly K[] =>
  Object.keys(of) as K[];

export const styleChoiceKeys = keysOf(styleChoices);

/** The choices told by their words; one that is not told, or unknown, is the first of its kind. */
export function choicesFrom(word: (choice: StyleChoice) => unknown): MadeChoices {
  const made = styleChoiceKeys.map((choice) => {
    const [first, ...others] = styleChoices[choice];
    return [choice, others.find((each) => each === word(choice)) ?? first];
  });
  return everyChoice(made);
}

/** The pairs hold every choice: they were made from the list of them. */
const everyChoice = (pairs: readonly (readonly string[])[]): MadeChoices =>
  Object.fromEntries(pairs) as MadeChoices;

/** One choice made, of an option from its own list. */
export const choiceMade = (choice: StyleChoice, option: string): Partial<MadeChoices> => ({
  [choice]: option,
});

/** When a figure has a meaning, for those that have not always one. */
const when: { readonly [K in StyleLength]?: (made: MadeChoices) => boolean } = {
  // A straight top line has neither dip nor peak.
  neckDepth: ({ topLine }) => topLine !== 'straight',
  neckWidth: ({ topLine }) => topLine !== 'straight',
  waistSeamRise: ({ waistSeam }) => waistSeam === 'raised',
  flareFraction: ({ flare }) => flare === 'circle',
  hemSweep: ({ flare }) => flare !== 'circle',
  bandHeight: isOffShoulder,
  pleatRatio: ({ sleeve }) => sleeve === 'pleatedBand',
  armEase: isOffShoulder,
  stretch: ({ cloth }) => cloth === 'stretch',
};

/** What a figure stands beside: the choices made, and whether the house gives intakes outright. */
type Beside = MadeChoices & { readonly rules: Pick<HouseRules, 'intakes'> };

/**
 * Whether a figure has a meaning beside the choices made. One that has none stays as it was typed until
 * it has one again.
 */
export const applies = (field: FieldKey, made: Beside): boolean => {
  if (intakeFields.some((intake) => intake === field)) return made.rules.intakes !== undefined;
  const key = styleLengthOf(field);
  return key === undefined || (when[key]?.(made) ?? true);
};

const styleLengthOf = (field: FieldKey): StyleLength | undefined =>
  lengthsThatHang.find((key) => field === `style.${key}`);

const lengthsThatHang = keysOf(when);
