import { publishedCriteria } from 'shared'
import { civilDateIn } from '../platform/clock/civil-date.js'
import type { Tx } from '../platform/database/tx.js'
import { actingAs, type Cast } from './cast.js'
import type { DemoRules } from './demo-district.js'
import type { DemoServices } from './demo-services.js'

/** Criteria, settings, costs and schedules, in force from one transaction on; left alone where they are already. */
export async function enterRules(services: DemoServices, cast: Cast, rules: DemoRules): Promise<void> {
  await services.work.run(cast.administrator.actor, async (tx) => {
    if ((await services.criteriaSets.list(tx)).length > 0) return
    const year = Number(civilDateIn(cast.timeZone, tx.at).slice(0, 4))
    await enterCriteria(services, tx, year)
    const { version } = await services.settings.read(tx)
    await services.settings.save(tx, version, rules.settings)
    const costList = await services.costLists.create(tx, rules.costList(year))
    await services.costLists.putInForce(tx, costList.id)
    const byOffice = actingAs(tx, cast.office)
    for (const input of rules.schedules(year)) {
      const schedule = await services.schedules.create(byOffice, input)
      await services.schedules.putInForce(byOffice, schedule.id)
    }
  })
}

async function enterCriteria({ criteriaSets }: DemoServices, tx: Tx, year: number): Promise<void> {
  const set = { name: 'Published criteria', effectiveFrom: `${year}-01-01`, criteria: publishedCriteria }
  const { id } = await criteriaSets.create(tx, set)
  await criteriaSets.putInForce(tx, id)
}
