import type { CoreMeasure } from './card.ts';
import { figureHeights as at, type Measure } from './measure.ts';

/**
 * The ten core measures. Bounds are wider than the extremes of 600 women of the Spanish sizing survey
 * (reference.md section 1) for the girths; for the lengths they are common practice, no source.
 */
export const coreMeasureGuide: { readonly [K in CoreMeasure]: Measure } = {
  bustGirth: {
    label: 'Bust',
    term: 'Bust girth',
    isoNumberFromMemory: '5.3.4',
    how: 'Level round the fullest part of the bust and under the arms, over the bra or cups that will be worn, breathing quietly.',
    min: 680,
    max: 1400,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.bust },
  },
  underbustGirth: {
    label: 'Under-bust',
    term: 'Under-bust girth',
    isoNumberFromMemory: '5.3.6',
    how: 'Level and snug round the ribs directly under the breasts; this is where a strapless bodice holds.',
    min: 540,
    max: 1260,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.underbust },
  },
  waistGirth: {
    label: 'Waist',
    term: 'Waist girth',
    isoNumberFromMemory: '5.3.10',
    how: 'Round the natural waist, where a cord tied loosely comes to rest; leave the cord on for the lengths.',
    min: 540,
    max: 1400,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.waist },
  },
  hipGirth: {
    label: 'Hip',
    term: 'Hip girth',
    isoNumberFromMemory: '5.3.13',
    how: 'Level round the fullest part of the seat, feet together.',
    min: 750,
    max: 1580,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.hip },
  },
  bustSpan: {
    label: 'Bust span',
    term: 'Bust point to bust point',
    how: 'Straight across from one bust point to the other, not into the hollow between.',
    min: 130,
    max: 290,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: -0.045, y: at.bust },
        { x: 0.045, y: at.bust },
      ],
    },
  },
  sideNeckToBustPoint: {
    label: 'Side neck to bust point',
    term: 'Side neck point to bust point',
    how: 'From where the shoulder meets the neck, straight down to the bust point.',
    min: 190,
    max: 400,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.03, y: at.neck },
        { x: 0.045, y: at.bust },
      ],
    },
  },
  sideNeckToUnderbust: {
    label: 'Side neck to under-bust',
    term: 'Side neck point over the bust point to the under-bust',
    how: 'The same line carried on over the bust point and in to the crease under the breast.',
    min: 240,
    max: 520,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.03, y: at.neck },
        { x: 0.045, y: at.bust },
        { x: 0.043, y: at.underbust },
      ],
    },
  },
  frontWaistLength: {
    label: 'Front waist length',
    term: 'Side neck point over the bust point to the waist',
    how: 'From the side of the neck over the bust point and straight down to the waist cord.',
    min: 320,
    max: 640,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.03, y: at.neck },
        { x: 0.045, y: at.bust },
        { x: 0.04, y: at.waist },
      ],
    },
  },
  waistToHip: {
    label: 'Waist to hip',
    term: 'Waist to hips',
    how: 'From the waist cord down the side of the body to the level of the hip tape.',
    min: 140,
    max: 290,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.08, y: at.waist },
        { x: 0.105, y: at.hip },
      ],
    },
  },
  waistToFloor: {
    label: 'Waist to floor',
    term: 'Waist to floor, barefoot',
    how: 'From the waist cord over the side of the hip and straight down to the floor, without shoes: heels stand on the style card.',
    min: 850,
    max: 1250,
    tolerance: 5,
    kind: 'length',
    tape: {
      kind: 'length',
      view: 'front',
      through: [
        { x: 0.08, y: at.waist },
        { x: 0.105, y: at.hip },
        { x: 0.105, y: at.floor },
      ],
    },
  },
};
