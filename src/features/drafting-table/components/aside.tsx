import type { ReactNode } from 'react';

/** Before there is a table: what stands in the way of it, and what to do. */
export const Aside = ({ title, children }: { title: string; children: ReactNode }) => (
  <main id="content" className="mx-auto w-full max-w-md px-4 py-10">
    <title>{`Ellwand · ${title.toLowerCase()}`}</title>
    <h1 className="mb-4 text-2xl font-semibold">{title}</h1>
    {children}
  </main>
);
