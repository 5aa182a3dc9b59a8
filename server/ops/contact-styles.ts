import type { MeasureCard } from '#shared/body/card.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { bustDartRules, dartPlaces } from '#shared/drafts/bodice-block/style-card.ts';
import { type StyleChoice, styleChoices } from '#shared/drafts/gown/style-card.ts';
import type { DraftedInputs, Garment } from '#shared/engine/drafted.ts';

/** A row of a contact sheet: what was chosen, and the inputs it makes on a body. */
export type ContactStyle = {
  readonly title: string;
  readonly inputs: (card: MeasureCard, rules: HouseRules) => DraftedInputs;
};

/** A name of the style card as words: `topLine` becomes `Top line`. */
const inWords = (name: string): string =>
  name.charAt(0).toUpperCase() +
  name.slice(1).replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

const plain: ContactStyle = {
  title: 'As the style card stands when it is left open',
  inputs: (card, rules) => ({ card, style: {}, rules }),
};

const choices = Object.keys(styleChoices).filter((key): key is StyleChoice => key in styleChoices);

/** Every choice that is not its default, by itself. */
const gownChoices: readonly ContactStyle[] = choices.flatMap((key) =>
  styleChoices[key].slice(1).map((name): ContactStyle => ({
    title: `${inWords(key)}: ${inWords(name).toLowerCase()}`,
    inputs: (card, rules) => ({ card, style: { [key]: name }, rules }),
  })),
);

const bodicePlaces = dartPlaces.map((bustDart): ContactStyle => ({
  title: `Bust dart in the ${inWords(bustDart).toLowerCase()}`,
  inputs: (card, rules) => ({ garment: 'bodice-block', card, style: { bustDart }, rules }),
}));

const bodiceRules = bustDartRules.map((bustDartRule): ContactStyle => ({
  title: `Bust dart by the rule “${inWords(bustDartRule).toLowerCase()}”`,
  inputs: (card, rules) => ({ garment: 'bodice-block', card, style: { bustDartRule }, rules }),
}));

const skirtEases = [
  { title: 'As the style card stands when it is left open', style: {} },
  { title: 'Ease at the hip: 60 mm', style: { ease: { hip: 60 } } },
  { title: 'Seat: none, front and back alike', style: { seat: 0 } },
];

const skirts = skirtEases.map(({ title, style }): ContactStyle => ({
  title,
  inputs: (card, rules) => ({ garment: 'skirt-block', card, style, rules }),
}));

/** The rows of each garment's contact sheet. */
export const contactStyles: Readonly<Record<Garment, readonly ContactStyle[]>> = {
  gown: [plain, ...gownChoices],
  'bodice-block': [...bodicePlaces, ...bodiceRules],
  'skirt-block': skirts,
};
