import type { Step } from '../drafting/step.ts';

/** A run of steps at one part of the garment; `from` is the place of its first step in the draft. */
export type Chapter = {
  readonly part: string;
  readonly from: number;
  readonly steps: readonly Step[];
};

/** The steps in drafting order, gathered by the part they belong to; a part that is taken up again is told again. */
export function contents(steps: readonly Step[]): readonly Chapter[] {
  const chapters: { part: string; from: number; steps: Step[] }[] = [];
  for (const [place, step] of steps.entries()) {
    const last = chapters.at(-1);
    if (last?.part === step.part) last.steps.push(step);
    else chapters.push({ part: step.part, from: place, steps: [step] });
  }
  return chapters;
}
