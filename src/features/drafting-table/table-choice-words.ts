import { bustDartRuleWords, dartPlaceWords } from '#shared/drafts/bodice-block/bust-dart-words.ts';
import { choiceWords, type OptionWords } from '#shared/drafts/gown/choice-words.ts';

import type { TableChoice, TableChoices } from './style-choices.ts';

type Words = {
  readonly [C in TableChoice]: {
    readonly label: string;
    readonly options: { readonly [O in TableChoices[C][number]]: OptionWords };
  };
};

/** Every choice of the table in words, as the card and every message show them. */
export const tableChoiceWords: Words = {
  ...choiceWords,
  garment: {
    label: 'Garment',
    options: {
      gown: { word: 'gown', says: 'A fitted gown from the top line to the floor.' },
      'bodice-block': {
        word: 'bodice block',
        says: 'Neck to waist with one bust dart, to design from: its dart can be moved.',
      },
      'skirt-block': {
        word: 'skirt block',
        says: 'Waist to knee, straight, with its darts, to design from.',
      },
    },
  },
  bustDart: {
    label: 'Bust dart in',
    options: {
      shoulder: { word: 'shoulder', says: dartPlaceWords.shoulder },
      armhole: { word: 'armhole', says: dartPlaceWords.armhole },
      side: { word: 'side', says: dartPlaceWords.side },
      waist: { word: 'waist', says: dartPlaceWords.waist },
      neck: { word: 'neck', says: dartPlaceWords.neck },
      topLine: { word: 'top line', says: dartPlaceWords.topLine },
    },
  },
  bustDartRule: {
    label: 'Rule for the bust dart',
    options: {
      cup: { word: 'by cup', says: bustDartRuleWords.cup },
      shoulderTable: { word: 'shoulder width', says: bustDartRuleWords.shoulderTable },
      proportional: { word: 'by bust', says: bustDartRuleWords.proportional },
      lengths: { word: 'by lengths', says: bustDartRuleWords.lengths },
    },
  },
};
