import type { RouteObject } from 'react-router-dom'

/** What the office and the administrator keep: schedules, prices, settings, people. */
export const officeRoutes: RouteObject[] = [
  {
    path: 'schedules',
    lazy: async () => ({ Component: (await import('../pages/schedules-page')).SchedulesPage }),
  },
  {
    path: 'schedules/new',
    lazy: async () => ({ Component: (await import('../pages/new-schedule-page')).NewSchedulePage }),
  },
  {
    path: 'schedules/:scheduleId',
    lazy: async () => ({ Component: (await import('../pages/schedule-page')).SchedulePage }),
  },
  {
    path: 'cost-lists',
    lazy: async () => ({ Component: (await import('../pages/cost-lists-page')).CostListsPage }),
  },
  {
    path: 'cost-lists/new',
    lazy: async () => ({ Component: (await import('../pages/new-cost-list-page')).NewCostListPage }),
  },
  {
    path: 'settings',
    lazy: async () => ({ Component: (await import('../pages/settings-page')).SettingsPage }),
  },
  { path: 'people', lazy: async () => ({ Component: (await import('../pages/people-page')).PeoplePage }) },
  {
    path: 'people/new',
    lazy: async () => ({ Component: (await import('../pages/new-person-page')).NewPersonPage }),
  },
  {
    path: 'producers',
    lazy: async () => ({ Component: (await import('../pages/producers-page')).ProducersPage }),
  },
  {
    path: 'producers/new',
    lazy: async () => ({ Component: (await import('../pages/new-producer-page')).NewProducerPage }),
  },
  {
    path: 'producers/:producerId',
    lazy: async () => ({ Component: (await import('../pages/producer-page')).ProducerPage }),
  },
]
