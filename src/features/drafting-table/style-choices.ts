import { bustDartRules, dartPlaces } from '#shared/drafts/bodice-block/style-card.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { isOffShoulder, styleChoices, type StyleLength } from '#shared/drafts/gown/style-card.ts';
import { garments } from '#shared/engine/drafted.ts';

import { fieldsOf, intakeFields, styleFields, type FieldKey } from './fields.ts';

/** The choices of the table: what is drafted, those of a gown, and those of a bodice block. */
export const tableChoices = {
  garment: garments,
  ...styleChoices,
  bustDart: dartPlaces,
  bustDartRule: bustDartRules,
} as const;
export type TableChoices = typeof tableChoices;
export type TableChoice = keyof TableChoices;

/** Every choice of the table, made. */
export type MadeChoices = { readonly [C in TableChoice]: TableChoices[C][number] };

/** `keys` forgets which ones an object has. */
const keysOf = <K extends string>(of: { readonly [key in K]?: unknown }): readonly K[] =>
  Object.keys(of) as K[];

export const styleChoiceKeys = keysOf(styleChoices);
export const tableChoiceKeys = keysOf(tableChoices);

/** The choices told by their words; one that is not told, or unknown, is the first of its kind. */
export function choicesFrom(word: (choice: TableChoice) => unknown): MadeChoices {
  const made = tableChoiceKeys.map((choice) => {
    const [first, ...others] = tableChoices[choice];
    return [choice, others.find((each) => each === word(choice)) ?? first];
  });
  return everyChoice(made);
}

/** The pairs hold every choice: they were made from the list of them. */
const everyChoice = (pairs: readonly (readonly string[])[]): MadeChoices =>
  Object.fromEntries(pairs) as MadeChoices;

/** One choice made, of an option from its own list. */
export const choiceMade = (choice: TableChoice, option: string): Partial<MadeChoices> => ({
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
  const ofStyle = styleFields.some((each) => each === field);
  if (ofStyle && !fieldsOf[made.garment].has(field)) return false;
  const key = styleLengthOf(field);
  return key === undefined || (when[key]?.(made) ?? true);
};

const styleLengthOf = (field: FieldKey): StyleLength | undefined =>
  lengthsThatHang.find((key) => field === `style.${key}`);

const lengthsThatHang = keysOf(when);
