import type { TextBlock } from './text-block.js'

/** What is asked before a spade goes in. The packet never says that a job is free of a rule. */
export const permitQuestions: TextBlock = {
  version: '2026-1',
  title: 'Cautions and permits',
  lead: 'Ask each office below, and keep its answer with this packet. Nothing here says that your job needs no permit: only the office can.',
  items: [
    {
      text: 'Utilities: call the utility-locating service before digging. Ask how many hours ahead in your state. Owners of private lines locate their own.',
      source: '29 CFR 1926.651(b)',
    },
    {
      text: 'Wetland: ask for a wetland determination before work in or beside wet ground.',
      source: 'Kansas State University, Water Practice Permits',
    },
    {
      text: 'Work in water: ask the Corps of Engineers whether the job needs a permit under section 404 of the Clean Water Act, and the state for its own permit.',
      source: '33 USC 1344',
    },
    {
      text: 'Streambed: ask the state office for stream or floodplain work before any machine enters the channel.',
      source: 'State law differs',
      bodies: ['stream', 'river'],
    },
    {
      text: 'Dam and spillway: ask the dam-safety office before work near a dam. Keep clear of dam, spillway and inflow.',
      source: 'George and Murphy, Kansas State University',
      bodies: ['pond', 'lake'],
    },
    {
      text: 'Water right: ask the state whether watering stock here needs a right or a registration.',
      source: 'State law differs',
    },
    {
      text: 'Cultural resources: ask for the review before ground is disturbed. If you find bone, hearth or worked stone, stop and call the district.',
      source: 'State practice sheets (New Mexico job sheet 443)',
    },
    {
      text: 'Plants and animals under protection: ask for the review before public money or work in the water.',
      source: 'Endangered Species Act, section 7 (from memory, verify)',
    },
    {
      text: 'Storm water: where an acre or more of ground is disturbed in all, ask for the construction storm-water permit.',
      source: '40 CFR 122.26(b)(15)',
    },
    {
      text: 'Road and county: ask about hauling stone, entrances and local codes.',
      source: 'Common practice, no source',
    },
  ],
}

export const cautions: readonly string[] = [
  'Do not start before written approval. Work begun early may not be paid.',
  'Working near water, in trenches and around machines can kill. Follow the site safety rules; give everyone in a trench a way out.',
  'Electric fence: no wire that can be under water is energized. Follow the energizer maker’s instructions for grounding.',
  'These figures are for review by a person licensed or authorised to do so. Local codes and the current standard of the state govern.',
  'Costs are estimates. What is paid rests on what is built, measured and certified, and may be less.',
  'Payments may be taxable. Ask whoever does your taxes.',
]
