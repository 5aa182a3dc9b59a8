import type { HouseRules } from './house-rules.ts';

const shared = {
  sideShare: 0.45,
  dartWidest: 40,
  dartClearance: 25,
  peakOverBust: 85,
  shoulderDrop: 127,
  allowance: {
    seam: 15,
    side: 25,
    zip: 25,
    top: 10,
    hem: 10,
    waist: 15,
    princess: 15,
    armhole: 10,
    facing: 6,
    straightHem: 40,
  },
} as const;

/** The default: the side seam stands a little behind the plain quarter at the bust, before it at the under-bust (method section 4). */
export const balanced: HouseRules = {
  balance: { chest: 6, bust: 10, underbust: -5, waist: 5, topHip: 2, hip: 0, knee: -5 },
  cupShare: 0.15,
  armholeAt: 'across',
  ...shared,
};

/** The plain direct draft many dressmakers use: front and back quarters alike at every level. */
export const quarterRule: HouseRules = {
  balance: { chest: 0, bust: 0, underbust: 0, waist: 0, topHip: 0, hip: 0, knee: 0 },
  cupShare: 0,
  armholeAt: 'shoulder',
  ...shared,
};

/** Whether rules move the side seam nowhere, as the plain quarter rule does. */
export const isQuarterRule = ({ balance }: HouseRules): boolean =>
  Object.values(balance).every((each) => each === 0);

/** The presets a rules file may start from. */
export const houseRulePresets = { balanced, quarterRule } as const;
export type HouseRulePreset = keyof typeof houseRulePresets;
