import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { dartPlaces } from '#shared/drafts/bodice-block/style-card.ts';
import { choiceWords } from '#shared/drafts/gown/choice-words.ts';
import { easeLevels, styleChoices } from '#shared/drafts/gown/style-card.ts';
import type { DraftedInputs } from '#shared/engine/drafted.ts';

/** One way to draft the same body otherwise. */
export type Otherwise = {
  /** As the page's address has it. */
  readonly key: string;
  readonly label: string;
  readonly change: (inputs: DraftedInputs) => DraftedInputs;
};

/** As drafted, with these house rules; the gown is told from the blocks where it matters. */
const byRules = (key: keyof typeof houseRulePresets, label: string): Otherwise => ({
  key: `rules-${key}`,
  label,
  change: (inputs) => ({ ...inputs, rules: houseRulePresets[key] }),
});

const noEase = Object.fromEntries(easeLevels.map((level) => [level, 0]));

/** Blocks are worn with some ease: the least each is drafted with. */
function withLeastEase(inputs: DraftedInputs): DraftedInputs {
  switch (inputs.garment) {
    case 'bodice-block':
      return { ...inputs, style: { ...inputs.style, ease: { bust: 20, waist: 0 } } };
    case 'skirt-block':
      return { ...inputs, style: { ...inputs.style, ease: { waist: 0, hip: 10 } } };
    case 'gown':
    case undefined:
      return { ...inputs, style: { ...inputs.style, ease: noEase } };
  }
}

/** Choices of the style card that change lines of the gown itself. */
const shown = ['topLine', 'shaping', 'waistSeam', 'flare', 'sleeve'] as const;

const styles: readonly Otherwise[] = shown.flatMap((choice) =>
  styleChoices[choice].map((option): Otherwise => {
    const { label, options } = choiceWords[choice];
    const words: { readonly [O in string]?: { readonly word: string } } = options;
    return {
      key: `${choice}-${option}`,
      label: `${label}: ${words[option]?.word ?? option}`,
      change: (inputs) =>
        inputs.garment === undefined || inputs.garment === 'gown'
          ? { ...inputs, style: { ...inputs.style, [choice]: option } }
          : inputs,
    };
  }),
);

const darts: readonly Otherwise[] = dartPlaces.map((place) => ({
  key: `dart-${place}`,
  label: `Bust dart in the ${place}`,
  change: (inputs) =>
    inputs.garment === 'bodice-block'
      ? { ...inputs, style: { ...inputs.style, bustDart: place } }
      : inputs,
}));

/** The ways to draft a garment otherwise, the most asked for first. */
export function otherwiseFor({ garment = 'gown' }: Pick<DraftedInputs, 'garment'>) {
  const own = garment === 'gown' ? styles : garment === 'bodice-block' ? darts : [];
  return [
    {
      key: 'no-ease',
      label: garment === 'gown' ? 'Without ease' : 'With the least ease',
      change: withLeastEase,
    },
    byRules('quarterRule', 'By the quarter rule'),
    byRules('balanced', 'By the balanced rules'),
    ...own,
  ];
}

/** The same body and house rules drafted as another garment, in its plain style. */
export function asGarment(
  inputs: DraftedInputs,
  garment: NonNullable<DraftedInputs['garment']>,
): DraftedInputs {
  if ((inputs.garment ?? 'gown') === garment) return inputs;
  const { card, rules } = inputs;
  switch (garment) {
    case 'gown':
      return { garment, card, style: {}, rules };
    case 'bodice-block':
      return { garment, card, style: {}, rules };
    case 'skirt-block':
      return { garment, card, style: {}, rules };
  }
}
