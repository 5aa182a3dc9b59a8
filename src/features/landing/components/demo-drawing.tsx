/**
 * The pieces of a demo gown as the engine drew them when the screens were built (`demo-gown.ts`): a file
 * of its own, used by reference so that its lines take the page's colours.
 */
export const DemoDrawing = () => (
  <figure>
    <svg
      viewBox="0 0 1600 975"
      className="h-auto w-full text-ink"
      role="img"
      aria-label="Front, back and flare of a gown as drafted, hanging from a measuring rod"
    >
      <use href="/demo-gown.svg#gown" />
    </svg>
    <figcaption className="pt-2 text-sm text-slate">
      Drawn by Ellwand for a sample body: cutting lines solid, seam lines dashed, marks every inch.
    </figcaption>
  </figure>
);
