import { type Depths, depthKeys, fixedDepths } from '#shared/regrade/style-depths.ts';

/** What becomes of the depths of the top edge on another body, for all of them alike. */
export const depthChoices = [
  { value: 'fixed', label: 'as drawn' },
  { value: 'proportional', label: 'in proportion' },
  { value: 'open', label: 'as the style card says' },
] as const;
export type DepthChoice = (typeof depthChoices)[number]['value'];

/** One sentence for each, below the choice. */
export const depthHints: { readonly [C in DepthChoice]: string } = {
  fixed: 'Peak, neck, side and back keep the figures they were drawn with, those left open too.',
  proportional: 'They grow and shrink with side neck to bust point.',
  open: 'What the style card leaves open follows the new body; what it gives stays.',
};

/** The rule for each depth. */
export function depthsFor(choice: DepthChoice): Depths {
  switch (choice) {
    case 'fixed':
      return fixedDepths;
    case 'proportional':
      return Object.fromEntries(depthKeys.map((key) => [key, 'proportional']));
    case 'open':
      return {};
  }
}
