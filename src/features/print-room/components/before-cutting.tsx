import { assembly, cuttingCautions } from '#shared/exports/cautions.ts';

/** How sheets become a pattern, and what can hurt on the way. */
export const BeforeCutting = () => (
  <section aria-labelledby="before-cutting" className="text-sm leading-snug">
    <h2 id="before-cutting" className="heading">
      Putting together
    </h2>
    <ol className="my-2 list-decimal space-y-1 pl-5">
      {assembly.map((each) => (
        <li key={each}>{each}</li>
      ))}
    </ol>
    <p className="text-slate">{cuttingCautions}</p>
  </section>
);
