import type { ApprovalLimits, Money } from 'shared'
import type { DemoPerson } from '../demo-district.js'

/** The designer's own limits are small. */
const narrow: ApprovalLimits = {
  maximumHead: 40,
  maximumDrainageAcres: 3,
  maximumFillHeightFt: 1,
  maximumCost: '5000.00' as Money,
}

/** Wide enough for every example: she makes the technical checks. */
const wide: ApprovalLimits = {
  maximumHead: 500,
  maximumDrainageAcres: 100,
  maximumFillHeightFt: 8,
  maximumCost: '100000.00' as Money,
}

interface Staff {
  planner: string
  checker: string
  supervisor: string
  office: string
  administrator: string
}

const staffOf = (domain: string, staff: Staff): DemoPerson[] => {
  const person = (
    name: string,
    role: DemoPerson['role'],
    approvalLimits: ApprovalLimits | null = null,
  ): DemoPerson => ({
    name,
    role,
    approvalLimits,
    email: `${name.toLowerCase().replace(/[^a-z]+/g, '.')}@${domain}`,
  })
  return [
    person(staff.planner, 'planner', narrow),
    person(staff.checker, 'planner', wide),
    person(staff.supervisor, 'supervisor'),
    person(staff.office, 'office'),
    person(staff.administrator, 'administrator'),
  ]
}

export const sableBasinPeople = staffOf('sable-basin.example', {
  planner: 'Ines Calloway',
  checker: 'Maren Tollefson',
  supervisor: 'Wilmot Roake',
  office: 'Desmond Pryor',
  administrator: 'Lucia Ferrand',
})

export const corrowForkPeople = staffOf('corrow-fork.example', {
  planner: 'Jonah Westerby',
  checker: 'Adela Kinsolving',
  supervisor: 'Ruben Hathersage',
  office: 'Noor Dalrymple',
  administrator: 'Tobias Greenlaw',
})
