import { Person } from '../accounts/person.entity.js'
import { District } from '../districts/district.entity.js'
import type { Asking } from '../jobs/job-access.service.js'
import type { AccountsTx, Tx } from '../platform/database/tx.js'
import type { DemoDistrict } from './demo-district.js'

export type StaffPart = 'planner' | 'checker' | 'supervisor' | 'office' | 'administrator'

/** The people of one district, each as the services know who asks. */
export type Cast = Record<StaffPart, Asking> & { districtId: string; timeZone: string }

export async function castOf({ manager }: AccountsTx, demo: DemoDistrict): Promise<Cast> {
  const { id: districtId, timeZone } = await manager.findOneByOrFail(District, { name: demo.name })
  const asking = async (role: string, index = 0): Promise<Asking> => {
    const person = demo.people.filter((each) => each.role === role)[index]
    if (person === undefined) throw new Error(`${demo.name} has no ${role} number ${index}.`)
    const { id: personId } = await manager.findOneByOrFail(Person, { email: person.email })
    return { actor: { personId, districtId, roles: [person.role] }, onlyJobId: null }
  }
  return {
    districtId,
    timeZone,
    planner: await asking('planner'),
    checker: await asking('planner', 1),
    supervisor: await asking('supervisor'),
    office: await asking('office'),
    administrator: await asking('administrator'),
  }
}

/** Several people act in one transaction here, so that a job is never left between two of their acts. */
export const actingAs = (tx: Tx, { actor }: Asking): Tx => ({ ...tx, personId: actor.personId })
