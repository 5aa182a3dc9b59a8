import type { Unit } from '#shared/units/said.ts';

import { browserStorage } from './browser-storage.ts';

/** Where the reader is at home, as far as the browser says. */
const region = (): string | undefined => new Intl.Locale(navigator.language).region;

/** Whether the reader's country prints on Letter paper. */
export const printsOnLetter = (): boolean => ['US', 'CA', 'MX', 'PH'].includes(region() ?? '');

const unitKey = 'ellwand.unit';

/** The unit the reader last chose in this browser, at whatever place; no answer where none was chosen. */
export function rememberedUnit(): Unit | undefined {
  try {
    const kept = browserStorage('local')?.getItem(unitKey);
    return kept === 'in' || kept === 'cm' ? kept : undefined;
  } catch {
    return undefined;
  }
}

/** Remembers a chosen unit for every place, where the browser allows it. */
export function rememberUnit(unit: Unit): void {
  try {
    browserStorage('local')?.setItem(unitKey, unit);
  } catch {
    // The choice holds for the place it was made at.
  }
}

/** The unit to begin in: the one last chosen, else that of the reader's country. */
export const readersUnit = (): Unit => rememberedUnit() ?? (region() === 'US' ? 'in' : 'cm');
