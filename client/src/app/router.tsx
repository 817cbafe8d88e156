import { createBrowserRouter, Navigate } from 'react-router-dom';
import { paths } from '../lib/paths';
import { SignedIn } from './signed-in';
import { RouteError } from './route-error';
import { ShellLayout } from './shell-layout';
import { SignedOut } from './signed-out';

/** Loads a page's code when its URL is first opened. */
const page = (load: () => Promise<{ default: React.ComponentType }>) => async () => ({
  Component: (await load()).default,
});

export const router = createBrowserRouter([
  {
    errorElement: <RouteError />,
    HydrateFallback: () => null,
    children: [
      { index: true, element: <Navigate to={paths.jobs} replace /> },
      {
        element: <SignedOut />,
        children: [
          { path: paths.signIn, lazy: page(() => import('../pages/sign-in-page')) },
          { path: paths.signUp, lazy: page(() => import('../pages/sign-up-page')) },
        ],
      },
      {
        element: <SignedIn />,
        children: [
          {
            element: <ShellLayout />,
            children: [
              {
                errorElement: <RouteError />,
                children: [
                  { path: paths.jobs, lazy: page(() => import('../pages/jobs-page')) },
                  { path: paths.job(':jobId'), lazy: page(() => import('../pages/job-page')) },
                  { path: paths.company, lazy: page(() => import('../pages/company-page')) },
                  { path: paths.me, lazy: page(() => import('../pages/me-page')) },
                ],
              },
            ],
          },
          {
            path: paths.run(':jobId', ':runId'),
            errorElement: <RouteError />,
            lazy: page(() => import('../pages/workbench-page')),
          },
        ],
      },
      { path: '*', lazy: page(() => import('../pages/not-found-page')) },
    ],
  },
]);
