import { RefusalError } from './refusal.ts';

/** How much one account may keep: more than a workroom makes in years, less than fills a disk. */
export const mostKept = {
  gowns: 500,
  measureCards: 500,
  people: 500,
  openClasses: 50,
  /** Of one gown. */
  namedRevisions: 100,
  automaticRevisions: 50,
  sessions: 30,
  knownDevices: 50,
} as const;

/** Refuses what would be one too many; nothing there is touched. */
export function refuseOneTooMany(
  what: 'gowns' | 'measure cards' | 'people' | 'open classes' | 'named revisions of one gown',
  present: number,
  most: number,
): void {
  if (present < most) return;
  throw new RefusalError(
    'account-full',
    `There are ${most} ${what} already, as many as are kept. Use one of them again.`,
  );
}
