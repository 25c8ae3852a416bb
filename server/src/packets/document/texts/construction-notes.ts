import type { TextBlock } from './text-block.js'

const common = 'Common practice, no source'
const district = 'Rule of the district'
const ksu = 'Kansas State University, Livestock Watering Handbook'
const georgia = 'USDA Georgia, guide sheet Stream Crossing, Ford (GA-578GS1)'
const osha = '29 CFR 1926.651(b)'
const heavyUse = 'USDA Alabama and Arkansas, heavy use area sheets'
const tennessee = 'Tennessee heavy use area sheet, November 2001'
const fence = 'USDA Virginia, electric fence job sheet 382, June 2009'

/** How the work is done. Figures stand on the drawings; these are the rules around them. */
export const constructionNotes: TextBlock = {
  version: '2026-1',
  title: 'Construction notes',
  lead: 'The drawings give the measures; these notes say how to reach them. Where the two disagree, stop and ask the district.',
  items: [
    {
      text: 'Do not begin before the district has approved in writing. Work begun early may not be paid.',
      source: district,
    },
    {
      text: 'Have buried lines located and marked before opening the ground, private lines too. No line on a drawing does not mean that there is none.',
      source: osha,
    },
    {
      text: 'Tell the district before you start, and again before stone covers the fabric, so that it can look. Ask how many days ahead.',
      source: district,
    },
    {
      text: 'Change no measure and no material unless the district agrees in writing first.',
      source: district,
    },
    {
      text: 'Set out from the bench mark and the stations of the profile. Check the elevation of full pool before the first cut.',
      source: common,
    },
    {
      text: 'Work at the water level that the profile names for building, or lower. If the water stands higher, wait or ask.',
      source: common,
    },
    {
      text: 'Build the outlet of the berm and make it firm before the berm can carry water. Build the berm before the ramp where you can.',
      source: common,
    },
    {
      text: 'Strip topsoil from the dry ground that will be disturbed, and heap it where it can go back.',
      source: common,
    },
    {
      text: 'Dig to the lines of the sections. Wet spoil is not fill: spread it on dry ground, away from water, spillway, inflow and wetland.',
      source: common,
    },
    {
      text: 'Take soft mud out down to firm ground and refill with base stone. If it is soft for more than 2 ft, stop and call the district.',
      source: common,
    },
    {
      text: 'Fill in layers and pack each layer. What must be filled below the water is rock or clean coarse stone, not earth.',
      source: common,
    },
    {
      text: 'Lay the fabric flat, without folds, on ground free of roots and sharp stone. Lap as drawn; the strip nearer the hill lies on top.',
      source: georgia,
    },
    {
      text: 'Drive no machine on bare fabric. Put at least 6 in of stone on it first, pushed ahead from stone already laid.',
      source: heavyUse,
    },
    { text: 'Cover the fabric within a few days; sunlight weakens it.', source: georgia },
    {
      text: 'Use clean, hard, angular stone. Large stone goes below, small stone on top, so that hoofs do not meet the large.',
      source: ksu,
    },
    {
      text: 'Lay each layer to the full thickness of the drawings, measured square to the slope, and press it in with the machine.',
      source: tennessee,
    },
    {
      text: 'Set brace posts before wire. Keep ground rods well apart from the farm service ground and from metal buildings and pipes.',
      source: fence,
    },
    {
      text: 'No wire that can be under water is energized. The closing panel carries no current, and no wire ties it to one that does.',
      source: 'Safety rule of the district',
    },
    { text: 'Ground the energizer as its maker says.', source: fence },
    {
      text: 'Seed and mulch bare ground as soon as it is shaped, and keep stock off until it holds.',
      source: common,
    },
    {
      text: 'Keep every load ticket, roll label and receipt. Certified quantities rest on them.',
      source: district,
    },
    {
      text: 'Keep machines out of the running stream as far as the work allows, and work at low flow.',
      source: georgia,
      bodies: ['stream', 'river'],
    },
    {
      text: 'Finish the ramp no higher than the bed of the stream, so that it neither dams nor scours.',
      source: georgia,
      bodies: ['stream', 'river'],
    },
  ],
}
