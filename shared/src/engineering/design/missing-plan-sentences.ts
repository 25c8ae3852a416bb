/** What a person reads beside a part that nobody has planned yet. */
export const missingPlanSentences = {
  herd: 'Enter the herd first: how many head, and of which kind.',
  site: 'Enter the water levels first.',
  ramp: 'Plan the ramp first: width, grade, top and toe.',
  earthwork: 'Choose the side slopes of the earthwork first.',
  rock: 'Choose the layers of rock first.',
  fabric: 'Choose the fabric first: roll, laps and ends.',
  pads: 'Say whether the ramp has an approach pad.',
  closingPanel: 'Plan the closing panel first.',
  fence: 'Lay out the fence first.',
  runoff: 'Enter the drainage area and the design storm first.',
  berm: 'Plan the berm first.',
  pond: 'Enter the areas of the pond by level first.',
  seeding: 'Choose the seed mix first.',
} as const

export type PlanPart = keyof typeof missingPlanSentences
