import { Outlet, ScrollRestoration } from 'react-router-dom';

/** What every place stands in: the way past the header, and the page itself. */
export const Frame = () => (
  <>
    <a
      href="#content"
      className="sr-only focus:not-sr-only focus:absolute focus:z-20 focus:m-2 focus:bg-ground focus:p-2"
    >
      To the content
    </a>
    <Outlet />
    <ScrollRestoration />
  </>
);
