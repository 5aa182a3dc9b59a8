import { figureHeights as at, type Measure } from './measure.ts';

/** The lengths and the slope that are estimated when nobody has taken them. Bounds: common practice, no source. */
export const furtherLengthGuide: {
  readonly [
    K in
      | 'backWaistLength'
      | 'armscyeDepth'
      | 'shoulderLength'
      | 'shoulderWidth'
      | 'acrossBack'
      | 'acrossFront'
      | 'waistToKnee'
      | 'shoulderSlope'
      | 'waistToTopHip'
      | 'underarmToWaist'
      | 'armLength'
      | 'height'
  ]: Measure;
} = {
  backWaistLength: {
    label: 'Back waist length',
    term: 'Back waist length',
    how: 'From the bone at the nape straight down the middle of the back to the waist cord.',
    min: 300,
    max: 540,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'back',
      through: [
        { x: 0, y: at.nape },
        { x: 0, y: at.waist },
      ],
    },
  },
  armscyeDepth: {
    label: 'Armhole depth',
    term: 'Scye depth',
    how: 'From the nape down the middle of the back to the level of the armpits; a ruler held under both arms shows it.',
    min: 130,
    max: 290,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'back',
      through: [
        { x: 0, y: at.nape },
        { x: 0, y: at.upperChest },
      ],
    },
  },
  shoulderLength: {
    label: 'Shoulder length',
    term: 'Shoulder length',
    isoNumberFromMemory: '5.4.1',
    how: 'From the side of the neck along the shoulder to its outer bone.',
    min: 90,
    max: 170,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.03, y: at.neck },
        { x: 0.1, y: at.shoulder },
      ],
    },
  },
  shoulderWidth: {
    label: 'Shoulder width',
    term: 'Shoulder width',
    how: 'Across the back from one shoulder bone to the other, over the nape.',
    min: 300,
    max: 520,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'back',
      through: [
        { x: -0.1, y: at.shoulder },
        { x: 0, y: at.nape },
        { x: 0.1, y: at.shoulder },
      ],
    },
  },
  acrossBack: {
    label: 'Across back',
    term: 'Back width',
    how: 'Across the shoulder blades from one arm crease to the other, arms hanging.',
    min: 280,
    max: 520,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'back',
      through: [
        { x: -0.09, y: 0.205 },
        { x: 0.09, y: 0.205 },
      ],
    },
  },
  acrossFront: {
    label: 'Across front',
    term: 'Across front width',
    how: 'Across the chest from one arm crease to the other, halfway between shoulder and armpit.',
    min: 260,
    max: 500,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: -0.085, y: 0.21 },
        { x: 0.085, y: 0.21 },
      ],
    },
  },
  waistToKnee: {
    label: 'Waist to knee',
    term: 'Waist to knee',
    how: 'From the waist cord straight down to the middle of the kneecap.',
    min: 460,
    max: 740,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.04, y: at.waist },
        { x: 0.045, y: at.knee },
      ],
    },
  },
  shoulderSlope: {
    label: 'Shoulder slope',
    term: 'Shoulder slope',
    how: 'The angle by which the shoulder falls from the side of the neck, held against a level.',
    min: 8,
    max: 35,
    tolerance: 2,
    kind: 'angle',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.03, y: at.neck },
        { x: 0.1, y: at.shoulder },
      ],
    },
  },
  waistToTopHip: {
    label: 'Waist to top hip',
    term: 'Waist to top hip',
    how: 'From the waist cord down the side to the level of the top hip tape.',
    min: 60,
    max: 170,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.08, y: at.waist },
        { x: 0.1, y: at.topHip },
      ],
    },
  },
  underarmToWaist: {
    label: 'Underarm to waist',
    term: 'Under-arm length',
    how: 'From the armpit line straight down the side to the waist cord.',
    min: 120,
    max: 330,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.085, y: at.upperChest },
        { x: 0.08, y: at.waist },
      ],
    },
  },
  armLength: {
    label: 'Arm length',
    term: 'Arm length',
    isoNumberFromMemory: '5.7.8',
    how: 'From the shoulder bone over the bent elbow to the wrist bone.',
    min: 480,
    max: 720,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.1, y: at.shoulder },
        { x: 0.135, y: 0.33 },
        { x: 0.15, y: 0.47 },
      ],
    },
  },
  height: {
    label: 'Height',
    term: 'Stature',
    how: 'From the crown of the head to the floor, barefoot, back against a wall.',
    min: 1350,
    max: 2050,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.14, y: 0 },
        { x: 0.14, y: at.floor },
      ],
    },
  },
};
