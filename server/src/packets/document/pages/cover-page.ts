import { moneyText, rampVignette, readyValue, sheetModel } from 'shared'
import type { Block, PageDraft } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'
import { namedFigures } from './named-figures.js'

const PICTURE_MM = 44

/** The job at a glance: whose, where, what, how much, and what stands on which page. */
export function coverPage(source: PacketSource, pages: { number: number; title: string }[]): PageDraft {
  const { job, district, producers, revision } = source
  const cost = readyValue(source.result.cost)
  const funding = readyValue(source.result.funding)
  const money = [
    ...(cost ? [{ name: 'Estimated cost', value: moneyText(cost.typical), unit: '' }] : []),
    ...(funding
      ? [{ name: 'Left to the landowner', value: moneyText(funding.landownerShare), unit: '' }]
      : []),
  ]
  const place = `Livestock watering ramp at ${job.waterName}, ${job.county} county`
  return {
    title: job.title,
    blocks: [
      { kind: 'paragraph', text: place, size: 'lead' },
      {
        kind: 'facts',
        facts: [
          { name: 'District', value: [district.name, ...district.addressLines].join(', ') },
          {
            name: producers.length > 1 ? 'Landowners' : 'Landowner',
            value: producers.map(producerText).join('\n'),
          },
          { name: 'Job', value: `${job.number}, revision ${revision}` },
          { name: 'Designed by', value: source.designerName },
        ],
      },
      ...picture(source),
      { kind: 'figures', figures: [...namedFigures(source), ...money] },
      { kind: 'heading', text: 'In this packet' },
      { kind: 'contents', pages },
    ],
  }
}

const producerText = ({ name, farmName, addressLines }: PacketSource['producers'][number]) =>
  [name, farmName, ...addressLines].join(', ')

function picture(source: PacketSource): Block[] {
  const { plan, result, survey } = source
  const model = sheetModel({ plan, result, groundLine: survey.groundLine })
  if (!model) return []
  const alt = 'Side view of the bank with the berm, the pad, the rock ramp and the water'
  const draw = (widthMm: number) =>
    rampVignette(model, { left: 0, top: 0, right: widthMm, bottom: PICTURE_MM })
  return [{ kind: 'picture', heightMm: PICTURE_MM, alt, draw }]
}
