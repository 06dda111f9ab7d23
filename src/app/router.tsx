import { createBrowserRouter, Navigate, type RouteObject } from 'react-router';
import { ErrorPage } from './error-page.tsx';
import { FirstLoad } from './first-load.tsx';
import { OpenLayout } from './open-layout.tsx';
import { SignedInLayout } from './signed-in-layout.tsx';

/** Every page comes in a file of its own, so that the first load stays small. */
export const routes: RouteObject[] = [
  {
    ErrorBoundary: ErrorPage,
    HydrateFallback: FirstLoad,
    children: [
      { index: true, element: <Navigate to="/jobs" replace /> },
      {
        Component: OpenLayout,
        children: [
          { path: 'sign-in', lazy: async () => ({ Component: (await import('./routes/sign-in.tsx')).SignInRoute }) },
          { path: 'sign-up', lazy: async () => ({ Component: (await import('./routes/sign-up.tsx')).SignUpRoute }) },
          { path: 'join/:token', lazy: async () => ({ Component: (await import('./routes/join.tsx')).JoinRoute }) },
          {
            path: 'forgot-password',
            lazy: async () => ({ Component: (await import('./routes/forgot-password.tsx')).ForgotPasswordRoute }),
          },
          {
            path: 'reset-password/:token',
            lazy: async () => ({ Component: (await import('./routes/reset-password.tsx')).ResetPasswordRoute }),
          },
          { path: '*', lazy: async () => ({ Component: (await import('./routes/not-found.tsx')).NotFoundRoute }) },
        ],
      },
      {
        Component: SignedInLayout,
        children: [
          {
            ErrorBoundary: ErrorPage,
            children: [
              { path: 'jobs', lazy: async () => ({ Component: (await import('./routes/jobs.tsx')).JobsRoute }) },
              { path: 'jobs/:jobId', lazy: async () => ({ Component: (await import('./routes/job.tsx')).JobRoute }) },
              {
                path: 'jobs/:jobId/box',
                lazy: async () => ({ Component: (await import('./routes/box.tsx')).BoxRoute }),
              },
              {
                path: 'jobs/:jobId/table',
                lazy: async () => ({ Component: (await import('./routes/frame-table.tsx')).FrameTableRoute }),
              },
              {
                path: 'jobs/:jobId/drawings',
                lazy: async () => ({ Component: (await import('./routes/tracing.tsx')).DrawingsRoute }),
              },
              {
                path: 'drawings/:tracingId',
                lazy: async () => ({ Component: (await import('./routes/tracing.tsx')).DrawingRoute }),
              },
              {
                path: 'frames/:frameId',
                lazy: async () => ({ Component: (await import('./routes/frame-page.tsx')).FramePageRoute }),
              },
              {
                path: 'frames/:frameId/sheet',
                lazy: async () => ({ Component: (await import('./routes/setup-sheet.tsx')).SetupSheetRoute }),
              },
              {
                path: 'frames/:frameId/compare',
                lazy: async () => ({ Component: (await import('./routes/compare.tsx')).CompareRoute }),
              },
              {
                path: 'cutters',
                lazy: async () => ({ Component: (await import('./routes/cutters.tsx')).CuttersRoute }),
              },
              {
                path: 'profiles',
                lazy: async () => ({ Component: (await import('./routes/profiles.tsx')).ProfilesRoute }),
              },
              {
                path: 'outbox',
                lazy: async () => ({ Component: (await import('./routes/outbox.tsx')).OutboxRoute }),
              },
              { path: 'people', lazy: async () => ({ Component: (await import('./routes/people.tsx')).PeopleRoute }) },
              { path: 'shop', lazy: async () => ({ Component: (await import('./routes/shop.tsx')).ShopRoute }) },
            ],
          },
        ],
      },
    ],
  },
];

export const router = createBrowserRouter(routes);
