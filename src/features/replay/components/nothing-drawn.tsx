import { Link } from 'react-router-dom';

type NothingDrawnProps = { readonly to: string; readonly label: string };

/** Where there is no draft to replay yet. */
export const NothingDrawn = ({ to, label }: NothingDrawnProps) => (
  <main id="content" className="mx-auto max-w-xl p-6">
    <title>Ellwand · replay</title>
    <h1 className="text-2xl font-semibold">Nothing is drawn yet</h1>
    <p className="mt-2">A replay tells how a draft came about, so it needs one first.</p>
    <p className="mt-4">
      <Link className="text-brass underline" to={to}>
        {label}
      </Link>
    </p>
  </main>
);
