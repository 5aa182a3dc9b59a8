import type { Choice } from '../../ui/segmented.tsx';
import {
  type DrawnHow,
  type LineChoice,
  type Orientation,
  type PrintScale,
  printScales,
  type SheetName,
  sheetNames,
} from '#shared/sheets/print-order.ts';
import { paperOf } from '#shared/sheets/papers.ts';
import type { RoomChoices } from './room-choices.ts';

/** A paper as it is named in a list. */
export const paperName = (paper: RoomChoices['paper']): string =>
  paper === 'custom' ? 'Your own size' : paperOf(paper).name;

export const paperChoices: readonly Choice<SheetName | 'custom'>[] = [
  ...sheetNames,
  'custom' as const,
].map((value) => ({ value, label: paperName(value) }));

export const orientationChoices: readonly Choice<Orientation>[] = [
  { value: 'portrait', label: 'Upright' },
  { value: 'landscape', label: 'Across' },
  { value: 'fewest', label: 'Fewest' },
];

export const lineWords: { readonly [L in LineChoice]: string } = {
  both: 'Cutting and seam line',
  cutting: 'Cutting line only',
  finished: 'Finished line only',
};

const scaleWords: { readonly [S in PrintScale]: string } = {
  1: 'True scale',
  0.5: 'Half, for teaching',
  0.25: 'Quarter, for teaching',
};

export const scaleChoices = printScales.map((scale) => ({
  value: String(scale),
  label: scaleWords[scale],
  scale,
}));

export const howWords: { readonly [H in DrawnHow]: string } = {
  'drawn once': 'once, as drafted',
  'mirrored pair': 'with its mirror image',
  'on fold': 'half, on the fold',
  'opened out': 'opened out',
};
