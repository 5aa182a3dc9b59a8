import type { IntakePlace } from './house-rules.ts';

/** One intake a maker may give outright: its name, what it does, and its bounds, mm. */
export type IntakeFigure = {
  readonly place: IntakePlace;
  readonly label: string;
  readonly hint: string;
  readonly min: number;
  readonly max: number;
};

/** Bounds: common practice, no source; what is given must leave cloth beside it, which the draft checks. */
export const intakeFigures: readonly IntakeFigure[] = [
  {
    place: 'topLine',
    label: 'Intake at the top line',
    hint: 'Opening of the dart or princess seam at the height of the peak.',
    min: 0,
    max: 60,
  },
  {
    place: 'underbust',
    label: 'Intake at the under-bust',
    hint: 'What dart or princess seam takes in at the under-bust.',
    min: 0,
    max: 80,
  },
  {
    place: 'waistSeam',
    label: 'Intake at the waist seam',
    hint: 'What dart or princess seam takes in at a raised waist seam.',
    min: 0,
    max: 80,
  },
  {
    place: 'waist',
    label: 'Intake at the waist',
    hint: 'What the darts of the skirt take in at the waist.',
    min: 0,
    max: 80,
  },
];
