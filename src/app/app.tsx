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
        path: paths.tablePrint,
        lazy: async () => ({ Component: (await import('./try-print-place.tsx')).TryPrintPlace }),
      },
      {
        path: paths.tableReplay,
        lazy: async () => ({ Component: (await import('./try-replay-place.tsx')).TryReplayPlace }),
      },
      {
        path: paths.gownReplay,
        lazy: async () => ({
          Component: (await import('./gown-replay-place.tsx')).GownReplayPlace,
        }),
      },
      {
        path: paths.class,
        lazy: async () => ({ Component: (await import('./class-place.tsx')).ClassPlace }),
      },
      {
        path: paths.gownPrint,
        lazy: async () => ({ Component: (await import('./gown-print-place.tsx')).GownPrintPlace }),
      },
      {
        path: paths.gown,
        lazy: async () => ({ Component: (await import('./gown-place.tsx')).GownPlace }),
      },
      {
        path: paths.card,
        lazy: async () => ({ Component: (await import('./card-place.tsx')).CardPlace }),
      },
      {
        lazy: async () => ({ Component: (await import('./places-frame.tsx')).PlacesFrame }),
        children: [
          {
            path: paths.signIn,
            lazy: async () => ({ Component: (await import('./sign-in-place.tsx')).SignInPlace }),
          },
          {
            path: paths.signUp,
            lazy: async () => ({ Component: (await import('./sign-up-place.tsx')).SignUpPlace }),
          },
          {
            path: paths.compare,
            lazy: async () => ({
              Component: (await import('../features/compare/routes/compare-page.tsx')).ComparePage,
            }),
          },
          {
            lazy: async () => ({ Component: (await import('./own-places.tsx')).OwnPlaces }),
            children: [
              {
                path: paths.clients,
                lazy: async () => ({
                  Component: (await import('../features/people/routes/clients-page.tsx'))
                    .ClientsPage,
                }),
              },
              {
                path: paths.client,
                lazy: async () => ({
                  Component: (await import('../features/people/routes/client-page.tsx')).ClientPage,
                }),
              },
              {
                path: paths.gownRegrade,
                lazy: async () => ({
                  Component: (await import('../features/compare/routes/regrade-page.tsx'))
                    .RegradePage,
                }),
              },
              {
                path: paths.gownNest,
                lazy: async () => ({
                  Component: (await import('../features/compare/routes/nest-page.tsx')).NestPage,
                }),
              },
              {
                path: paths.gowns,
                lazy: async () => ({
                  Component: (await import('../features/gowns/routes/gowns-page.tsx')).GownsPage,
                }),
              },
              {
                path: paths.cards,
                lazy: async () => ({
                  Component: (await import('../features/gowns/routes/measure-cards-page.tsx'))
                    .MeasureCardsPage,
                }),
              },
              {
                path: paths.classes,
                lazy: async () => ({
                  Component: (await import('../features/replay/routes/classes-page.tsx'))
                    .ClassesPage,
                }),
              },
              {
                path: paths.account,
                lazy: async () => ({
                  Component: (await import('./account-place.tsx')).AccountPlace,
                }),
              },
            ],
          },
        ],
      },
      {
        path: '*',
        lazy: async () => ({ Component: (await import('./no-such-place.tsx')).NoSuchPlace }),
      },
    ],
  },
]);

export const App = () => <RouterProvider router={router} />;
