import { Link } from 'react-router-dom';

/** The table has no pieces yet; the way there. */
export const NothingToPrint = ({ table }: { readonly table: string }) => (
  <main id="content" className="mx-auto w-full max-w-xl p-6">
    <title>Ellwand · print room</title>
    <h1 className="text-2xl font-semibold">Print room</h1>
    <p className="mt-2">
      There are no pieces to print yet: the table draws them as soon as the ten measures are in.
    </p>
    <p className="mt-4">
      <Link to={table} className="text-brass underline">
        To the table
      </Link>
    </p>
  </main>
);
