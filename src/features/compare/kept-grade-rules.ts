import { z } from 'zod';

import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { type GradeRules, starterRules } from '#shared/regrade/grade-rules.ts';

import { browserStorage } from '../../lib/browser-storage.ts';

const key = 'ellwand.grade-rules';
const steps = z.record(z.string(), z.number());

/** Every measure a rule may step, in the order of the card. */
export const gradedMeasures = [...coreMeasures, ...furtherMeasures];

/** The grade rules as this browser kept them; the starter set where it kept none it can read. */
export function keptGradeRules(): GradeRules {
  try {
    const kept = steps.safeParse(JSON.parse(browserStorage('local')?.getItem(key) ?? 'null'));
    if (!kept.success) return starterRules;
    const known = gradedMeasures.flatMap((measure) => {
      const step = kept.data[measure];
      return step === undefined ? [] : [[measure, step] as const];
    });
    return Object.fromEntries(known);
  } catch {
    return starterRules;
  }
}

/** Keeps the grade rules in this browser, where it allows it. */
export function keepGradeRules(rules: GradeRules): void {
  try {
    browserStorage('local')?.setItem(key, JSON.stringify(rules));
  } catch {
    // A browser that keeps nothing has the starter set again next time.
  }
}
