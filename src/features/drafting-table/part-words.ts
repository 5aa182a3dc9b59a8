import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { houseRuleFigures } from '#shared/drafting/house-rule-figures.ts';
import type { HouseRulePreset } from '#shared/drafting/house-rule-presets.ts';
import { intakeFigures } from '#shared/drafting/intake-figures.ts';
import { bodiceBlockLengths } from '#shared/drafts/bodice-block/style-card.ts';
import type { OptionWords } from '#shared/drafts/gown/choice-words.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { styleKeys } from '#shared/drafts/gown/style-limits.ts';
import { skirtLengthWords } from '#shared/drafts/skirt-block/style-card.ts';
import type { Unit } from '#shared/units/said.ts';

import { rewritten, type FieldKey } from './fields.ts';
import type { Change } from './history.ts';
import { partKeys, readRules, type Part, type PartKey } from './parts.ts';
import { tableChoiceKeys } from './style-choices.ts';
import { tableChoiceWords } from './table-choice-words.ts';
import { presetOf } from './table-inputs.ts';

const cardWords = {
  name: 'Whose card',
  date: 'Day of the card',
  overruled: 'Warnings kept with a reason',
  rules: 'House rules',
} as const;

const words = new Map<string, string>([
  ...Object.entries(cardWords),
  ...tableChoiceKeys.map((choice) => [choice, tableChoiceWords[choice].label] as const),
  ...[...coreMeasures, ...furtherMeasures].map(
    (key) => [`card.${key}`, measureGuide[key].label] as const,
  ),
  ...styleKeys.map((key) => [`style.${key}`, styleLabels[key]] as const),
  ...(['armholeDrop', 'shoulderEase'] as const).map(
    (key) => [`style.${key}`, bodiceBlockLengths[key].label] as const,
  ),
  ...(['seat', 'length'] as const).map(
    (key) => [`style.${key}`, skirtLengthWords[key].label] as const,
  ),
  ...houseRuleFigures.map(({ key, label }) => [`rules.${key}`, label] as const),
  ...intakeFigures.map(({ place, label }) => [`rules.intakes.${place}`, label] as const),
]);

/** The trade's word for a part of the table. */
export const partLabel = (key: PartKey): string => words.get(key) ?? key;

/** A part as the reader writes it; what is left open says so. */
export function partWords(key: PartKey, part: Part, unit: Unit): string {
  if (part === null || part === '') return 'left open';
  if (key === 'rules' && typeof part === 'string') return rulesWords(part);
  if (key === 'overruled' && typeof part === 'string') return part === '[]' ? 'none' : 'some';
  if (typeof part === 'string') return optionWord(key, part);
  return isField(key) ? rewritten(key, part, unit).text : part.text;
}

/** The name of a preset, or that the rules are none. */
function rulesWords(written: string): string {
  const rules = readRules(JSON.parse(written));
  const preset = rules && presetOf(rules);
  return preset === undefined ? 'own' : presetWords[preset];
}

/** The presets of the house rules as the panel calls them. */
export const presetWords: { readonly [P in HouseRulePreset]: string } = {
  balanced: 'balanced',
  quarterRule: 'quarter rule',
};

const options = new Map(
  tableChoiceKeys.map((choice) => [
    choice,
    new Map(Object.entries<OptionWords>(tableChoiceWords[choice].options)),
  ]),
);

/** A choice's option as the style card calls it. */
const optionWord = (key: PartKey, option: string): string =>
  tableChoiceKeys
    .filter((choice) => choice === key)
    .map((choice) => options.get(choice)?.get(option)?.word)[0] ?? option;

const isField = (key: PartKey): key is FieldKey => key.includes('.');

/** What a change was about: `neck depth`, or how many things at once. */
export function changeWords({ before, after }: Change): string {
  const keys = partKeys.filter((key) => key in before || key in after);
  const [only] = keys;
  return keys.length === 1 && only !== undefined
    ? partLabel(only).toLowerCase()
    : `${keys.length} changes at once`;
}
