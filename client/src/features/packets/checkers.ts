import { reachOf, type ApprovalLimits, type PersonView } from 'shared'

export interface Checker {
  id: string
  name: string
  limits: ApprovalLimits | null
  isDesigner: boolean
}

/**
 * Who holds a role that checks. The job names its designer by name only, so a name that two people bear settles nothing
 * here; the server, which knows the ids, decides again.
 */
export function checkersOf(people: readonly PersonView[], designerName: string | null): Checker[] {
  const bearers = people.filter(({ name }) => name === designerName)
  return people
    .filter(({ id, isActive, roles }) => {
      const actor = { personId: id, districtId: '', roles }
      return isActive && reachOf(actor, 'packet:check') !== null
    })
    .map(({ id, name, approvalLimits }) => ({
      id,
      name,
      limits: approvalLimits,
      isDesigner: bearers.length === 1 && bearers[0]?.id === id,
    }))
}
