import { Button } from '../ui/button.tsx';
import { paths } from './paths.ts';

/** Shown when a place cannot be opened: its script did not arrive, or it broke. */
export const PlaceFailed = () => (
  <main className="mx-auto max-w-xl p-6">
    <title>Ellwand · not opened</title>
    <h1 className="text-2xl font-semibold">This page did not open</h1>
    <p className="mt-2">
      Your work is kept in this browser. Check that you are connected, then open the page again.
    </p>
    <p className="mt-4 flex flex-wrap items-center gap-4">
      <Button kind="primary" onClick={() => location.reload()}>
        Open again
      </Button>
      <a className="text-brass underline" href={paths.landing}>
        To the front page
      </a>
    </p>
  </main>
);
