/** What a person does in a district. One person may hold several. */
export const roles = ['planner', 'landowner', 'supervisor', 'office', 'administrator'] as const

export type Role = (typeof roles)[number]

export interface Actor {
  readonly personId: string
  readonly districtId: string
  readonly roles: readonly Role[]
}
