import type { RouteObject } from 'react-router-dom'

/** What a landowner opens: the mailed link, then the one job. */
export const landownerRoutes: RouteObject[] = [
  {
    lazy: async () => ({ Component: (await import('./entry-shell')).EntryShell }),
    children: [
      { path: '/enter', lazy: async () => ({ Component: (await import('../pages/enter-page')).EnterPage }) },
    ],
  },
  {
    path: '/my/:jobId',
    lazy: async () => ({ Component: (await import('./landowner-shell')).LandownerShell }),
    children: [
      { index: true, lazy: async () => ({ Component: (await import('../pages/my-job-page')).MyJobPage }) },
      {
        path: 'read/:page',
        lazy: async () => ({ Component: (await import('../pages/read-packet-page')).ReadPacketPage }),
      },
      { path: 'sign', lazy: async () => ({ Component: (await import('../pages/sign-page')).SignPage }) },
      {
        path: 'ask',
        lazy: async () => ({ Component: (await import('../pages/ask-change-page')).AskChangePage }),
      },
      {
        path: 'withdraw',
        lazy: async () => ({ Component: (await import('../pages/my-withdraw-page')).MyWithdrawPage }),
      },
      {
        path: 'take-back',
        lazy: async () => ({ Component: (await import('../pages/take-back-page')).TakeBackPage }),
      },
    ],
  },
]
