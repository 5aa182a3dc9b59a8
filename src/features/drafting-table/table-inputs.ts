import { coreMeasures, furtherMeasures, type MeasureCard } from '#shared/body/card.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { houseRulePresets, type HouseRulePreset } from '#shared/drafting/house-rule-presets.ts';
import {
  easeLevels,
  styleLengths,
  type StyleCard,
  type TopLineShape,
} from '#shared/drafts/gown/style-card.ts';

import { valueOf, type Entries, type FieldKey } from './fields.ts';

const measures = [...coreMeasures, ...furtherMeasures];

/** The card as far as it has been filled in. */
export type PartCard = Partial<MeasureCard>;

export type Choices = {
  readonly name: string;
  readonly date?: string | undefined;
  readonly topLine: TopLineShape;
  readonly shaping: 'princess' | 'darts';
  readonly preset: HouseRulePreset;
  readonly entries: Entries;
};

/** The measure card standing in the fields; what is empty or cannot be read is left out. */
export function cardOf(choices: Choices): PartCard {
  const taken = measures.flatMap((key) => {
    const value = valueOf(choices.entries[`card.${key}`]);
    return value === undefined ? [] : [[key, value] as const];
  });
  return {
    ...(choices.name.trim() === '' ? {} : { name: choices.name.trim() }),
    ...(choices.date === undefined ? {} : { date: choices.date }),
    ...Object.fromEntries(taken),
  };
}

/**
 * Whether a figure has a meaning beside the choices made: a straight top line has neither dip nor peak.
 * One that has none stays as it was typed until it has one again.
 */
export const applies = (field: FieldKey, { topLine }: Pick<Choices, 'topLine'>): boolean =>
  topLine !== 'straight' || (field !== 'style.neckDepth' && field !== 'style.neckWidth');

/** The style card standing in the fields; what is left empty takes the draft's default. */
export function styleOf(choices: Choices): StyleCard {
  const lengths = styleLengths.flatMap((key) => {
    const value = valueOf(choices.entries[`style.${key}`]);
    const given = value !== undefined && applies(`style.${key}`, choices);
    return given ? [[key, value] as const] : [];
  });
  const ease = easeLevels.flatMap((level) => {
    const value = valueOf(choices.entries[`style.ease.${level}`]);
    return value === undefined ? [] : [[level, value] as const];
  });
  return {
    ...Object.fromEntries(lengths),
    topLine: choices.topLine,
    shaping: choices.shaping,
    ...(ease.length === 0 ? {} : { ease: Object.fromEntries(ease) }),
  };
}

export const rulesOf = (choices: Choices): HouseRules => houseRulePresets[choices.preset];

export const hasCoreMeasures = (card: PartCard): card is MeasureCard =>
  coreMeasures.every((key) => card[key] !== undefined);

/** A gown to lay out on the table: a sample, or one from elsewhere. */
export type LaidGown = {
  readonly card: MeasureCard;
  readonly style: StyleCard;
  readonly rules: HouseRules;
};

/** What a gown's cards give for a field, if anything. */
export function givenFor(
  field: FieldKey,
  card: { readonly [K in keyof MeasureCard]?: MeasureCard[K] | undefined },
  style: StyleCard,
): number | undefined {
  const measure = measures.find((key) => field === `card.${key}`);
  if (measure !== undefined) return card[measure];
  const length = styleLengths.find((key) => field === `style.${key}`);
  if (length !== undefined) return style[length];
  const level = easeLevels.find((key) => field === `style.ease.${key}`);
  return level === undefined ? undefined : style.ease?.[level];
}

/** The preset a gown's rules came from; rules of a workroom's own are not yet kept here. */
export const presetOf = ({ balance }: HouseRules): HouseRulePreset =>
  Object.values(balance).every((each) => each === 0) ? 'quarterRule' : 'balanced';
