/**
 * The pieces of a demo gown as the engine drew them at build time (`vite.config.ts`): a file of its own,
 * used by reference so that its lines take the page's colours.
 */
export const DemoDrawing = () => (
  <figure>
    <svg
      viewBox="0 0 1400 1000"
      className="h-auto w-full text-ink"
      role="img"
      aria-label="Front, back and flare pieces of a gown with their seam and cutting lines"
    >
      <use href="/demo-gown.svg#gown" />
    </svg>
    <figcaption className="pt-2 text-sm text-slate">
      Drawn by Ellwand from a sample body: cutting line solid, seam line dashed.
    </figcaption>
  </figure>
);
