/**
 * How many random bodies a law is tried on, and from which seed. `LAW_RUNS` and `LAW_SEED` change
 * them; the seed is printed, so that a body that breaks a law can be drawn again.
 */
const whole = (name: string, otherwise: number): number => {
  const asked = Number(process.env[name] ?? otherwise);
  return Number.isInteger(asked) && asked > 0 ? asked : otherwise;
};

export const lawRuns = whole('LAW_RUNS', 1000);
const lawSeed = whole('LAW_SEED', 20_261_201);

/** Parameters for fast-check, printed once for each law. */
export function lawParameters(
  law: string,
  numRuns = lawRuns,
): { readonly numRuns: number; readonly seed: number } {
  process.stdout.write(`law: ${law}: ${numRuns} cases, seed ${lawSeed}\n`);
  return { numRuns, seed: lawSeed };
}
