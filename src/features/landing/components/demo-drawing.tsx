/**
 * The pieces of a demo gown as the engine drew them when the screens were built (`demo-gown.ts`): a file
 * of its own, used by reference so that its lines take the page's colours.
 */
export const DemoDrawing = () => (
  <figure>
    <svg
      viewBox="0 0 1600 975"
      className="hidden h-auto w-full text-ink sm:block"
      role="img"
      aria-label="Front, back and flare of a gown as drafted, hanging from a measuring rod"
    >
      <use href="/demo-gown.svg#gown" />
    </svg>
    <svg
      viewBox="0 0 1000 960"
      className="h-auto w-full text-ink sm:hidden"
      role="img"
      aria-label="Front and back of a gown as drafted, hanging from a measuring rod"
    >
      <use href="/demo-gown.svg#gown-narrow" />
    </svg>
    <figcaption className="pt-2 text-sm text-slate">
      Drawn by Ellwand for a sample body, marks every inch. The two green seams are sewn together,
      and are of one length.
    </figcaption>
  </figure>
);
