/** Dashes of the sizes of a nest, mm: told apart without colour, each as long as the eye needs. */
const dashes: readonly (readonly number[])[] = [
  [7, 3],
  [2, 2],
  [12, 2, 2, 2],
  [4, 4],
  [16, 4],
  [7, 2, 1, 2, 1, 2],
  [1, 3],
  [12, 2, 4, 2],
  [4, 1],
  [9, 5],
  [3, 2, 1, 2],
  [20, 2, 1, 2],
];

/** How a size is drawn: the card's own solid and heavier, each other one in a dash of its own. */
export type SizePen = { readonly width: number; readonly dash?: readonly number[] };

/** The pens of sizes by their steps, in order; the same steps always have the same pens. */
export const sizePens = (steps: readonly number[]): ReadonlyMap<number, SizePen> => {
  const others = steps.filter((step) => step !== 0);
  return new Map(
    steps.map((step): [number, SizePen] => {
      const dash = dashes[others.indexOf(step) % dashes.length];
      return step === 0 || dash === undefined
        ? [step, { width: 0.6 }]
        : [step, { width: 0.35, dash }];
    }),
  );
};
