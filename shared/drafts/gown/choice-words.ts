import type { StyleChoice, StyleChoices } from './style-card.ts';

/** How one option of a choice is called, and what it does in one sentence. */
export type OptionWords = { readonly word: string; readonly says: string };

/** The trade's word for a choice, and for each of its options. */
export type ChoiceWords<C extends StyleChoice> = {
  readonly label: string;
  readonly options: { readonly [O in StyleChoices[C][number]]: OptionWords };
};

/** Every choice of the style card in words, as the card and every message show them. */
export const choiceWords: { readonly [C in StyleChoice]: ChoiceWords<C> } = {
  topLine: {
    label: 'Top line',
    options: {
      sweetheart: { word: 'sweetheart', says: 'Rises to a peak over each bust and dips between.' },
      straight: { word: 'straight', says: 'Runs level across the front.' },
      scooped: { word: 'scooped', says: 'One wide, deep curve from side to side.' },
      notched: { word: 'notched', says: 'Dips to a point at the centre front.' },
    },
  },
  shaping: {
    label: 'Shaping',
    options: {
      princess: { word: 'princess', says: 'Two panels a half, their seam over the bust point.' },
      darts: { word: 'darts', says: 'One panel a half, folded into darts under the bust.' },
    },
  },
  waistSeam: {
    label: 'Waist seam',
    options: {
      raised: { word: 'raised', says: 'Joins top and skirt between under-bust and waist.' },
      natural: { word: 'natural', says: 'Joins top and skirt at the waist itself.' },
      none: { word: 'none', says: 'Top and skirt are cut in one.' },
    },
  },
  flare: {
    label: 'Flare',
    options: {
      circle: { word: 'circle', says: 'A ring of cloth set on at the knee, part of a circle.' },
      aLine: { word: 'A-line', says: 'Shallow arcs set on at the knee, to the hem you give.' },
      godets: { word: 'godets', says: 'The skirt runs on; wedges are let into its seams.' },
      integral: {
        word: 'integral',
        says: 'The seams themselves run on outwards, without a knee seam.',
      },
    },
  },
  sleeve: {
    label: 'Sleeve',
    options: {
      none: { word: 'none', says: 'Strapless, held by the bodice.' },
      plainBand: {
        word: 'plain band',
        says: 'Off the shoulder, with a plain band round the arms.',
      },
      pleatedBand: { word: 'pleated band', says: 'Off the shoulder, with a band laid in pleats.' },
    },
  },
  closure: {
    label: 'Closure',
    options: {
      centreBackZip: { word: 'back zip', says: 'A zip in the centre back, down past the waist.' },
      sideZip: {
        word: 'side zip',
        says: 'A zip in the left side seam; the back is cut on the fold.',
      },
      laced: { word: 'laced', says: 'A laced panel at the centre back, with room to adjust.' },
    },
  },
  facing: {
    label: 'Facing',
    options: {
      none: { word: 'none', says: 'The top edge is finished by the lining or a binding.' },
      faced: { word: 'faced', says: 'A shaped strip finishes the top edge inside.' },
    },
  },
  lining: {
    label: 'Lining',
    options: {
      none: { word: 'none', says: 'Unlined.' },
      lined: { word: 'lined', says: 'Lining pieces, cut from the same lines.' },
    },
  },
  boning: {
    label: 'Boning',
    options: {
      none: { word: 'none', says: 'No bones.' },
      boned: { word: 'boned', says: 'Bones along the seams of the bodice, and a waist stay.' },
    },
  },
  cloth: {
    label: 'Cloth',
    options: {
      woven: { word: 'woven', says: 'Cloth that does not stretch round the body.' },
      stretch: { word: 'stretch', says: 'Cloth that stretches round the body.' },
    },
  },
};
