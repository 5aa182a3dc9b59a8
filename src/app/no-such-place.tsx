import { Link } from 'react-router-dom';

import { paths } from './paths.ts';

export const NoSuchPlace = () => (
  <main className="mx-auto max-w-xl p-6">
    <title>Ellwand · no such page</title>
    <h1 className="text-2xl font-semibold">There is no page here</h1>
    <p className="mt-2">
      <Link className="text-brass underline" to={paths.landing}>
        To the front page
      </Link>
    </p>
  </main>
);
