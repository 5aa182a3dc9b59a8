import type { TableChoice, TableChoices } from './style-choices.ts';

/** How a line is drawn, by the trade's convention: cut solid, seam dashed, dart legs thin, what only helps hairline. */
export type Look = 'cut' | 'seam' | 'thin' | 'hair';

/** A line of a small drawing, 40 wide and 48 high; unless it stands `once`, its mirror image is drawn too. */
export type Line = { readonly look: Look; readonly d: string; readonly once?: true };

type Drawings = {
  readonly [C in TableChoice]: { readonly [O in TableChoices[C][number]]: readonly Line[] };
};

const cut = (d: string): Line => ({ look: 'cut', d });
const seam = (d: string): Line => ({ look: 'seam', d });
const thin = (d: string): Line => ({ look: 'thin', d });
const hair = (d: string): Line => ({ look: 'hair', d });
const once = (line: Line): Line => ({ ...line, once: true });

/** The right half of a bodice's side and lower edge, near to. */
const side = 'C35 22 33 28 32.5 40L20 40';
const sweetheart = 'M20 17C23 8 28 7 30 8C33 9 34 13 36 16';
const bodice = `${sweetheart}${side}`;

/** A gown from bust to hip, its right side; what lies below follows it. */
const torso = 'M20 7C21.5 3 25 3 26 4.5L27 7C27 12 24.5 13 24.5 16';
const toHip = 'C24.5 20 27.5 21 27.5 26';
const toKnee = `${toHip}C27.5 31 25.5 32 25 35`;
const gown = `${torso}${toKnee}`;
const trumpet = `${gown}L33 46C28 47.4 24 47.6 20 47.6`;
const knee = seam('M20 35.8C22 35.8 24 35.5 25 35');
/** From bust to hip, near to. */
const waisted = 'M20 10C22 5 27.5 5 29.5 7L31 10C31 18 26 20 26 26C26 33 31 35 31 46';
const waist = hair('M20 26.2H26');

/** Neck, shoulders and arms, right half. */
const shoulders = 'M22 2V6C24 8 31 8 33 11L35 30M30 18L31 30';
const offShoulder = 'M20 22C24 18 28 19 30 21C30 30 28 34 28 42L20 42';

/** The back from waist to hip, near to. */
const back = 'M20 10C26 9 30 8 33 7C33 18 29 20 29 26C29 34 34 36 34 46L20 46';

/** The front of a bodice block, its bust dart closed, and the bust point in it. */
const blockFront = once(cut('M8 10C11 10 14 8 15 4L26 7C24 12 25 18 31 21L29 42H8Z'));
const dart = (mouth: string, back: string): Line => once(thin(`M${mouth}L18 24L${back}`));
const shoulderDart = dart('18.6 5', '22 6');

export const choiceDrawings: Drawings = {
  topLine: {
    sweetheart: [cut(bodice)],
    straight: [cut(`M20 10H28C32 10.4 34 13 36 16${side}`)],
    scooped: [cut(`M20 21C29 21 28 9 31 9C33 9 34 13 36 16${side}`)],
    notched: [cut(`M20 19L26 9C28 7 30 7 31 8C33 9 34 13 36 16${side}`)],
  },
  shaping: {
    princess: [cut(bodice), seam('M30 8C30 20 27 24 26.5 40')],
    darts: [cut(bodice), thin('M24.5 40L27 21L29 40')],
  },
  waistSeam: {
    raised: [cut(waisted), seam('M20 21.6C23 21.6 26 21 27.6 20.4'), waist],
    natural: [cut(waisted), seam('M20 26.6C22 26.6 24.6 26.4 26 26')],
    none: [cut(waisted), waist],
  },
  flare: {
    circle: [cut(trumpet), knee, hair('M21.5 36L24 47M24 35.4L29.5 46.6')],
    aLine: [cut(`${gown}L28.5 46.6C25 47.3 22 47.4 20 47.4`), knee],
    godets: [
      cut(`${gown}L25.6 46L30 45.6L25 35`),
      cut('M25.6 46C23 46.6 21 46.6 20 46.6'),
      seam('M25 35L25.6 46'),
    ],
    integral: [
      cut(`${gown}C25.4 40 28 43 31 45.6C27 47 23 47.4 20 47.4`),
      seam('M22.6 4C23 14 21.5 28 22 35C22.3 40 24 44 25.5 47'),
    ],
  },
  sleeve: {
    none: [hair(shoulders), cut('M20 24C22 18 26 17 28 19L30 21C30 30 28 34 28 42L20 42')],
    plainBand: [
      hair(shoulders),
      cut(offShoulder),
      cut('M30 20L33.6 17C35.4 18 36 23 35 25L30 27Z'),
    ],
    pleatedBand: [
      hair(shoulders),
      cut(offShoulder),
      cut('M30 20L33.6 17C35.4 18 36 23 35 25L30 27Z'),
      thin('M30 22L34.8 18.6M30 23.8L35.3 20.6M30 25.4L35.4 22.8'),
    ],
  },
  closure: {
    centreBackZip: [
      cut(back),
      once(seam('M20 10V46')),
      once(thin('M18.6 12H21.4M18.6 15H21.4M18.6 18H21.4M18.6 21H21.4M18.6 24H21.4M18.6 27H21.4')),
      once(thin('M20 28.5L21.2 31H18.8Z')),
    ],
    sideZip: [
      cut(back),
      once(hair('M20 10V46')),
      once(
        thin('M6.4 10L9 9.2M7 13.2L9.6 12.2M8.4 16.4L11 15.4M9.8 19.6L12.4 19M10 22.8L12.6 22.6'),
      ),
    ],
    laced: [
      cut('M23 9.6C27 9 30 8 33 7C33 18 29 20 29 26C29 34 34 36 34 46L20 46'),
      cut('M23 9.6L22 30'),
      once(
        thin(
          'M17 11L23 14M23 11L17 14M17.4 16L22.7 19M22.7 16L17.4 19M17.6 21L22.4 24M22.4 21L17.6 24',
        ),
      ),
      once(seam('M20 30V46')),
    ],
  },
  facing: {
    none: [cut(bodice)],
    faced: [cut(bodice), seam('M20 24C23 15 27 14 30 15C33 16 33.6 20 35 22')],
  },
  lining: {
    none: [cut(trumpet)],
    lined: [
      cut(trumpet),
      hair(
        'M20 9C22 5.4 24 5.4 25.4 8C25.4 12 23 13 23 16C23 20 26 21 26 26C26 31 24 32 23.4 35L28 44.6',
      ),
    ],
  },
  boning: {
    none: [cut(bodice)],
    boned: [cut(bodice), thin('M24 16V38M25 16V38M24 16H25M24 38H25M31 14L29.4 38M32 14L30.4 38')],
  },
  cloth: {
    woven: [
      once(cut('M6 8H34V40H6Z')),
      once(hair('M6 14H34M6 20H34M6 26H34M6 32H34M12 8V40M18 8V40M24 8V40M30 8V40')),
    ],
    stretch: [
      once(cut('M6 8H34V40H6Z')),
      once(thin('M10 24H30M10 24L13.5 21.5M10 24L13.5 26.5M30 24L26.5 21.5M30 24L26.5 26.5')),
      once(hair('M11 8V40M17 8V18M17 30V40M23 8V18M23 30V40M29 8V40')),
    ],
  },
  garment: {
    gown: [cut(trumpet)],
    'bodice-block': [blockFront, shoulderDart, dart('16 42', '20 42')],
    'skirt-block': [
      once(cut('M9 9C15 9 21 8.4 26 6C29 12 31 18 31 26V46H9Z')),
      once(thin('M18.6 8.6L20 19L21.8 8')),
    ],
  },
  bustDart: {
    shoulder: [blockFront, shoulderDart],
    armhole: [blockFront, dart('25 14.5', '26.4 18')],
    side: [blockFront, dart('30.5 27', '30 31')],
    waist: [blockFront, dart('14.5 42', '21.5 42')],
    neck: [blockFront, dart('11 9.8', '13.4 8')],
    topLine: [blockFront, dart('16.4 4.4', '19.6 5.2'), once(hair('M8 17H24.4'))],
  },
  bustDartRule: {
    cup: [blockFront, shoulderDart, once(hair('M18 24C14 22 12 28 15 31C18 33 24 32 25 28'))],
    shoulderTable: [blockFront, shoulderDart, once(hair('M18.6 2.5L22 3.5'))],
    proportional: [blockFront, shoulderDart, once(hair('M8 24H30.6'))],
    lengths: [blockFront, shoulderDart, once(hair('M15 4L18 24V42M34 7V42'))],
  },
};
