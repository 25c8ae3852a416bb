import type { CostListView, ScheduleView, SettingsView } from 'shared'
import { ApiPerson } from './api-person'
import { northPond } from './example'
import { signInOf } from './sign-ins'

/** The settings, prices and schedules of the example, whatever other tests have put in force before. */
export async function putExampleRulesInForce(): Promise<void> {
  const administrator = await ApiPerson.signedIn(signInOf('administrator'))
  const { version } = await administrator.get<SettingsView>('/settings')
  await administrator.put('/settings', { settings: northPond.settings }, version)
  const costList = await administrator.post<CostListView>('/cost-lists', northPond.costList)
  await administrator.act(`/cost-lists/${costList.id}/put-in-force`)
  for (const input of northPond.schedules) {
    const schedule = await administrator.post<ScheduleView>('/schedules', input)
    await administrator.act(`/schedules/${schedule.id}/put-in-force`)
  }
}
