import { type Depths, depthKeys, fixedDepths } from '#shared/regrade/style-depths.ts';

/** What becomes of the depths of the top edge on another body, for all of them alike. */
export const depthChoices = [
  { value: 'fixed', label: 'as drawn' },
  { value: 'proportional', label: 'in proportion' },
  { value: 'open', label: 'as the style card says' },
] as const;
export type DepthChoice = (typeof depthChoices)[number]['value'];

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
