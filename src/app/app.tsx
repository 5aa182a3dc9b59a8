import { createBrowserRouter, RouterProvider } from 'react-router-dom';

import { Frame } from './frame.tsx';
import { Opening } from './opening.tsx';
import { paths } from './paths.ts';
import { PlaceFailed } from './place-failed.tsx';

const router = createBrowserRouter([
  {
    element: <Frame />,
    errorElement: <PlaceFailed />,
    HydrateFallback: Opening,
    children: [
      {
        path: paths.landing,
        lazy: async () => ({
          Component: (await import('../features/landing/routes/landing-page.tsx')).LandingPage,
        }),
      },
      {
        path: paths.table,
        lazy: async () => ({
          Component: (await import('../features/drafting-table/routes/try-page.tsx')).TryPage,
        }),
      },
      {
        path: '*',
        lazy: async () => ({ Component: (await import('./no-such-place.tsx')).NoSuchPlace }),
      },
    ],
  },
]);

export const App = () => <RouterProvider router={router} />;
