import type { RouteObject } from 'react-router-dom'

/** The job table, a new job, and one job with its tabs. */
export const jobRoutes: RouteObject[] = [
  { path: 'jobs', lazy: async () => ({ Component: (await import('../pages/jobs-page')).JobsPage }) },
  { path: 'jobs/new', lazy: async () => ({ Component: (await import('../pages/new-job-page')).NewJobPage }) },
  {
    path: 'jobs/:jobId',
    lazy: async () => ({ Component: (await import('../pages/job-frame-page')).JobFramePage }),
    children: [
      { index: true, lazy: async () => ({ Component: (await import('../pages/job-page')).JobPage }) },
      {
        path: 'survey',
        lazy: async () => ({ Component: (await import('../pages/survey-page')).SurveyPage }),
      },
      {
        path: 'design',
        lazy: async () => ({ Component: (await import('../pages/designs-page')).DesignsPage }),
      },
      {
        path: 'design/:designId/:part',
        lazy: async () => ({ Component: (await import('../pages/design-page')).DesignPage }),
      },
      {
        path: 'figures',
        lazy: async () => ({ Component: (await import('../pages/figures-page')).FiguresPage }),
      },
      {
        path: 'checks',
        lazy: async () => ({ Component: (await import('../pages/checks-page')).ChecksPage }),
      },
      {
        path: 'cost-share',
        lazy: async () => ({ Component: (await import('../pages/cost-share-page')).CostSharePage }),
      },
      {
        path: 'packet',
        lazy: async () => ({ Component: (await import('../pages/packet-page')).PacketPage }),
      },
      { path: 'notes', lazy: async () => ({ Component: (await import('../pages/notes-page')).NotesPage }) },
      {
        path: 'review',
        lazy: async () => ({ Component: (await import('../pages/review-page')).ReviewPage }),
      },
      { path: 'send', lazy: async () => ({ Component: (await import('../pages/send-page')).SendPage }) },
      {
        path: 'timeline',
        lazy: async () => ({ Component: (await import('../pages/timeline-page')).TimelinePage }),
      },
    ],
  },
]
