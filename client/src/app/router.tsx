import { createBrowserRouter, type RouteObject } from 'react-router-dom'
import { ErrorPage } from './error-page'
import { PageLoading } from './page-loading'
import { jobRoutes } from './job-routes'
import { landownerRoutes } from './landowner-routes'
import { officeRoutes } from './office-routes'

const staffRoutes: RouteObject = {
  path: '/',
  lazy: async () => ({ Component: (await import('./staff-shell')).StaffShell }),
  HydrateFallback: PageLoading,
  children: [
    { index: true, lazy: async () => ({ Component: (await import('../pages/home-page')).HomePage }) },
    { path: 'desk', lazy: async () => ({ Component: (await import('../pages/desk-page')).DeskPage }) },
    ...jobRoutes,
    ...officeRoutes,
    {
      path: 'account',
      lazy: async () => ({ Component: (await import('../pages/account-page')).AccountPage }),
    },
    { path: '*', lazy: async () => ({ Component: (await import('../pages/not-found-page')).NotFoundPage }) },
  ],
}

/** Each page is its own file to load: a landowner never fetches a planner's page. */
export const router = createBrowserRouter([
  {
    ErrorBoundary: ErrorPage,
    HydrateFallback: PageLoading,
    children: [
      {
        path: '/sign-in',
        lazy: async () => ({ Component: (await import('../pages/sign-in-page')).SignInPage }),
      },
      ...landownerRoutes,
      staffRoutes,
    ],
  },
])
