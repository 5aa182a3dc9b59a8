import {
  coreMeasures,
  furtherMeasures,
  type MeasureCard,
  type Overruled,
} from '#shared/body/card.ts';
import type { DraftedInputs } from '#shared/engine/drafted.ts';
import { houseRuleFigures } from '#shared/drafting/house-rule-figures.ts';
import { houseRulePresets, type HouseRulePreset } from '#shared/drafting/house-rule-presets.ts';
import { intakePlaces, type HouseRules, type IntakePlace } from '#shared/drafting/house-rules.ts';
import {
  easeLevels,
  styleChoices,
  styleLengths,
  type StyleCard,
} from '#shared/drafts/gown/style-card.ts';

import { isRecord } from './is-record.ts';
import { ruleFields, valueOf, type Entries, type FieldKey } from './fields.ts';
import { applies, styleChoiceKeys, tableChoiceKeys, type MadeChoices } from './style-choices.ts';

const measures = [...coreMeasures, ...furtherMeasures];

/** The card as far as it has been filled in. */
export type PartCard = Partial<MeasureCard>;

export type Choices = MadeChoices & {
  readonly name: string;
  readonly date?: string | undefined;
  /** Warnings about the card that the maker keeps, each with her reason. */
  readonly overruled: readonly Overruled[];
  /** The house rules the table was begun with; figures typed over them stand in the entries. */
  readonly rules: HouseRules;
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
    ...(choices.overruled.length === 0 ? {} : { overruled: choices.overruled }),
    ...Object.fromEntries(taken),
  };
}

/** These stood in every style card from the first gown on; the others only where they are not the first of their kind. */
const written: ReadonlySet<string> = new Set(['topLine', 'shaping']);

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
  const made = styleChoiceKeys.flatMap((choice) =>
    written.has(choice) || choices[choice] !== styleChoices[choice][0]
      ? [[choice, choices[choice]] as const]
      : [],
  );
  return {
    ...Object.fromEntries(lengths),
    ...Object.fromEntries(made),
    ...(ease.length === 0 ? {} : { ease: Object.fromEntries(ease) }),
  };
}

/** What the fields ask to be drafted for a body. */
export function inputsOf<Card extends PartCard>(choices: Choices, card: Card) {
  const rules = rulesOf(choices);
  const { garment, bustDart, bustDartRule, entries } = choices;
  const waist = valueOf(entries['style.ease.waist']);
  switch (garment) {
    case 'gown':
      return { card, style: styleOf(choices), rules };
    case 'bodice-block': {
      const style = {
        ease: { bust: valueOf(entries['style.ease.bust']), waist },
        armholeDrop: valueOf(entries['style.armholeDrop']),
        shoulderEase: valueOf(entries['style.shoulderEase']),
        bustDart,
        bustDartRule,
      };
      return { garment, card, style: given(style), rules };
    }
    case 'skirt-block': {
      const style = {
        ease: { waist, hip: valueOf(entries['style.ease.hip']) },
        seat: valueOf(entries['style.seat']),
        length: valueOf(entries['style.length']),
      };
      return { garment, card, style: given(style), rules };
    }
  }
}

/** A style card without what is left open: the same card has one draft number however it came about. */
const given = <S extends object>(style: S): S => JSON.parse(JSON.stringify(style)) as S;

/** The house rules with the figures typed over them. */
export function rulesOf({ rules, entries }: Pick<Choices, 'rules' | 'entries'>): HouseRules {
  const typed = houseRuleFigures.reduce((now, { key, put }) => {
    const value = valueOf(entries[`rules.${key}`]);
    return value === undefined ? now : put(now, value);
  }, rules);
  if (typed.intakes === undefined) return typed;
  return intakePlaces.reduce((now, place) => {
    const value = valueOf(entries[`rules.intakes.${place}`]);
    return value === undefined ? now : withIntake(now, place, value);
  }, typed);
}

const withIntake = (rules: HouseRules, place: IntakePlace, value: number): HouseRules =>
  rules.intakes === undefined ? rules : { ...rules, intakes: { ...rules.intakes, [place]: value } };

/** The entries without the figures of the house rules. */
export const withoutRules = (entries: Entries): Entries =>
  Object.fromEntries(
    Object.entries(entries).filter(([key]) => !ruleFields.some((rule) => rule === key)),
  );

/** All of the table that is kept, part by part: where none of them is another there is nothing to keep. */
export const workOf = (choices: Choices): readonly unknown[] => [
  ...tableChoiceKeys.map((choice) => choices[choice]),
  ...[choices.name, choices.date, choices.overruled, choices.rules, choices.entries],
];

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
  style: DraftedInputs['style'],
): number | undefined {
  const measure = measures.find((key) => field === `card.${key}`);
  if (measure !== undefined) return card[measure];
  const [of, first = '', second] = field.split('.');
  if (of !== 'style') return undefined;
  const found: unknown = Reflect.get(style, first);
  const value = second === undefined || !isRecord(found) ? found : found[second];
  return typeof value === 'number' ? value : undefined;
}

/** The preset the rules are, figure for figure; rules of a workroom's own are none. */
export const presetOf = (rules: HouseRules): HouseRulePreset | undefined =>
  presets.find((preset) => {
    const its = houseRulePresets[preset];
    const words = rules.intakes === undefined && rules.armholeAt === its.armholeAt;
    return words && houseRuleFigures.every(({ value }) => value(rules) === value(its));
  });

const presets: readonly HouseRulePreset[] = ['balanced', 'quarterRule'];
