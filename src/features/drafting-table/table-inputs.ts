import { coreMeasures, furtherMeasures, type MeasureCard } from '#shared/body/card.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { houseRulePresets, type HouseRulePreset } from '#shared/drafting/house-rule-presets.ts';
import { easeLevels, styleLengths, type StyleCard } from '#shared/drafts/gown/style-card.ts';

import { valueOf, type Entries } from './fields.ts';

/** The card as far as it has been filled in. */
export type PartCard = Partial<MeasureCard>;

export type Choices = {
  readonly name: string;
  readonly date?: string | undefined;
  readonly shaping: 'princess' | 'darts';
  readonly preset: HouseRulePreset;
  readonly entries: Entries;
};

/** The measure card standing in the fields; what is empty or cannot be read is left out. */
export function cardOf(choices: Choices): PartCard {
  const measures = [...coreMeasures, ...furtherMeasures].flatMap((key) => {
    const value = valueOf(choices.entries[`card.${key}`]);
    return value === undefined ? [] : [[key, value] as const];
  });
  return {
    ...(choices.name.trim() === '' ? {} : { name: choices.name.trim() }),
    ...(choices.date === undefined ? {} : { date: choices.date }),
    ...Object.fromEntries(measures),
  };
}

/** The style card standing in the fields; what is left empty takes the draft's default. */
export function styleOf(choices: Choices): StyleCard {
  const lengths = styleLengths.flatMap((key) => {
    const value = valueOf(choices.entries[`style.${key}`]);
    return value === undefined ? [] : [[key, value] as const];
  });
  const ease = easeLevels.flatMap((level) => {
    const value = valueOf(choices.entries[`style.ease.${level}`]);
    return value === undefined ? [] : [[level, value] as const];
  });
  return {
    ...Object.fromEntries(lengths),
    shaping: choices.shaping,
    ...(ease.length === 0 ? {} : { ease: Object.fromEntries(ease) }),
  };
}

export const rulesOf = (choices: Choices): HouseRules => houseRulePresets[choices.preset];

export const hasCoreMeasures = (card: PartCard): card is MeasureCard =>
  coreMeasures.every((key) => card[key] !== undefined);
