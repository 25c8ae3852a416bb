import type { TextBlock } from './text-block.js'

const common = 'Common practice, no source'
const ksu = 'Kansas State University, Livestock Watering Handbook'
const heavyUse = 'Operation and maintenance sheet of practice 561'
const watering = 'Operation and maintenance plan form of practice 614'

/** What keeps the work working for its life. */
export const operationAndMaintenance: TextBlock = {
  version: '2026-1',
  title: 'Operation and maintenance',
  lead: 'You keep the work in order for its practice life. The district may look at it; the agreement with each fund says for how long.',
  items: [
    {
      text: 'Look at ramp, berm and fence after every large storm and at least twice a year, before and after the grazing season.',
      source: common,
    },
    {
      text: 'Take off mud, manure and drift. Put back surface stone where hoofs or waves have moved it.',
      source: ksu,
    },
    {
      text: 'Fill ruts and hollows with stone of the size in the drawings. If fabric shows, cover it at once.',
      source: heavyUse,
    },
    {
      text: 'Keep water from the hill off the rock: mend low spots of the berm, clear its channel and outlet.',
      source: heavyUse,
    },
    {
      text: 'Move or mend the closing panel when the level of the water changes. It is never energized.',
      source: ksu,
    },
    {
      text: 'Walk the fence. Mend broken wire and braces; keep growth off the energized wires; test the voltage.',
      source: common,
    },
    {
      text: 'Keep the energizer and its grounding as the maker says. Test the ground rods in the dry season.',
      source: common,
    },
    {
      text: 'Keep stock and machines off new seeding until it holds, then mow or graze it lightly.',
      source: common,
    },
    {
      text: 'The ramp is made for the herd named in this packet. Ask before you water more animals at it.',
      source: watering,
    },
    {
      text: 'Keep stock off the dam and out of the spillway; watch for burrowing animals.',
      source: 'Pacific Southwest Inter-Agency Committee, 1962',
      bodies: ['pond'],
    },
    {
      text: 'Write down what you found and mended, with the date. The district asks for it.',
      source: watering,
    },
    {
      text: 'Tell the district before you change, move or remove anything that was paid for.',
      source: 'Rule of the district',
    },
  ],
}

/** Lives that publications give; the agreement of each fund governs. */
export const practiceLives: readonly { practice: string; name: string; years: string; source: string }[] = [
  {
    practice: '561',
    name: 'Heavy use area: ramp and pad',
    years: '10 or more',
    source: 'Operation and maintenance sheet of practice 561',
  },
  { practice: '382', name: 'Fence', years: '10 to 20', source: 'State editions of practice 382 differ' },
  { practice: '362', name: 'Diversion: berm', years: '10', source: 'From memory, verify' },
  { practice: '342', name: 'Critical area planting', years: '10', source: 'From memory, verify' },
]
