import type { DesignPart, DesignPartName, DesignView } from 'shared'

export type PlacedDesign = Pick<DesignView, 'id' | 'jobId'>

/** Under which part of the plan the inputs of a result are entered. */
const planPartOf: { readonly [part in DesignPartName]: DesignPart } = {
  herd: 'herd',
  profile: 'ramp',
  earthwork: 'earthwork',
  rock: 'rock',
  fabric: 'fabric',
  approachPad: 'pads',
  closingPanel: 'closingPanel',
  fence: 'fence',
  runoff: 'runoff',
  berm: 'berm',
  pond: 'pond',
  seeding: 'seeding',
}

export const planPlace = ({ id, jobId }: PlacedDesign, part: DesignPart): string =>
  `/jobs/${jobId}/design/${id}/${part}`

/** Where to go for a part, or for a result of all parts that something waits for. */
export function partPlace(design: PlacedDesign, name: string): string {
  if (name in planPartOf) return planPlace(design, planPartOf[name as DesignPartName])
  return `/jobs/${design.jobId}/${name === 'cost' ? 'cost-share' : 'figures'}`
}

/** Inputs that are not entered in the plan. */
const outsideThePlan: readonly { under: string; place: (design: PlacedDesign) => string }[] = [
  { under: 'site.groundLine', place: ({ jobId }) => `/jobs/${jobId}/survey` },
  { under: 'settings', place: () => '/settings' },
  { under: 'costList', place: () => '/cost-lists' },
  { under: 'quantities', place: ({ jobId }) => `/jobs/${jobId}/design` },
  { under: 'sources', place: (design) => planPlace(design, 'funding') },
]

/** Where the input stands that a formula complained about, such as `ramp.gradeRunPerRise`. */
export function fieldPlace(design: PlacedDesign, field: string): string {
  const outside = outsideThePlan.find(({ under }) => field === under || field.startsWith(`${under}.`))
  if (outside) return outside.place(design)
  const [root = field] = field.split(/[.[]/)
  return planPlace(design, root as DesignPart)
}
