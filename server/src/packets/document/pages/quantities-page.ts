import { feetAndInches, numberText, readyValue } from 'shared'
import type { Block, PageDraft, TableRow } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'
import { namedFigures, quantityText } from './named-figures.js'

/** What is dug, bought and put up, each with where its figure comes from. */
export function quantitiesPage(source: PacketSource): PageDraft {
  const lines = readyValue(source.result.quantities) ?? []
  return {
    title: 'Quantities',
    blocks: [
      {
        kind: 'facts',
        facts: namedFigures(source).map(({ name, value, unit }) => ({
          name,
          value: `${value} ${unit}`.trim(),
        })),
      },
      { kind: 'heading', text: 'Bill of quantities' },
      {
        kind: 'table',
        columns: [
          { title: 'Item', share: 30 },
          { title: 'Practice', share: 10 },
          { title: 'Quantity', share: 18, align: 'right' },
          { title: 'Where it comes from', share: 42 },
        ],
        rows: lines.map((line) => ({
          cells: [line.description, line.practice, quantityText(line), line.fromFigure],
        })),
      },
      {
        kind: 'paragraph',
        size: 'small',
        tone: 'mute',
        text: 'Stone and fabric are as ordered, with waste and laps. What is paid and checked is what lies in place.',
      },
      ...stone(source),
      ...fabric(source),
      ...fence(source),
    ],
  }
}

function stone({ plan, result }: PacketSource): Block[] {
  const rock = readyValue(result.rock)
  if (!rock) return []
  const rows = rock.layers.map((layer, index): TableRow => {
    const chosen = plan.rock?.layers[index]
    const size = chosen
      ? `${numberText(chosen.stoneSizeIn)} in, ${numberText(chosen.thicknessIn)} in thick`
      : ''
    return {
      cells: [
        layer.name,
        size,
        numberText(layer.volumeYd3, 2),
        numberText(layer.tons, 2),
        numberText(layer.orderTons, 2),
        layer.loads === undefined ? '–' : numberText(layer.loads),
      ],
    }
  })
  return [
    { kind: 'heading', text: 'Stone of the ramp by layer' },
    {
      kind: 'table',
      columns: [
        { title: 'Layer', share: 24 },
        { title: 'Stone', share: 28 },
        { title: 'In place, yd³', share: 14, align: 'right' },
        { title: 'In place, tons', share: 14, align: 'right' },
        { title: 'To order, tons', share: 14, align: 'right' },
        { title: 'Loads', share: 9, align: 'right' },
      ],
      rows: [
        ...rows,
        {
          kind: 'sum',
          cells: ['Ramp', '', '', numberText(rock.totalTons, 2), numberText(rock.totalOrderTons, 2), ''],
        },
      ],
    },
  ]
}

function fabric({ plan, result }: PacketSource): Block[] {
  const value = readyValue(result.fabric)
  if (!value || !plan.fabric) return []
  const chosen = value[value.recommended]
  return [
    { kind: 'heading', text: 'Fabric' },
    {
      kind: 'facts',
      facts: [
        { name: 'Kind', value: plan.fabric.product },
        {
          name: 'Ground covered',
          value: `${numberText(value.netAreaFt2, 1)} ft² (${numberText(value.netAreaFt2 / 9, 1)} yd²)`,
        },
        {
          name: 'To buy',
          value: `${numberText(chosen.grossAreaFt2, 1)} ft² (${numberText(chosen.grossAreaFt2 / 9, 1)} yd²), ${chosen.rolls} ${chosen.rolls === 1 ? 'roll' : 'rolls'}`,
        },
        {
          name: 'Laid',
          value: `${value.recommended} the ramp, ${chosen.strips} strips of ${feetAndInches(chosen.stripLengthFt)}; ${value.reason}`,
        },
      ],
    },
  ]
}

function fence({ plan, result }: PacketSource): Block[] {
  const value = readyValue(result.fence)
  if (!value) return []
  const setback =
    value.setbackFt === undefined
      ? []
      : [`Least distance from fence to water: ${numberText(value.setbackFt, 1)} ft.`]
  const habitat =
    value.habitatAreaFt2 === undefined
      ? []
      : [`Land set aside inside the fence: ${numberText(value.habitatAreaFt2 / 43560, 2)} acres.`]
  return [
    { kind: 'heading', text: 'Fence' },
    {
      kind: 'table',
      columns: [
        { title: 'Run', share: 26 },
        { title: 'Length, ft', share: 16, align: 'right' },
        { title: 'Line posts', share: 14, align: 'right' },
        { title: 'Wire, ft', share: 16, align: 'right' },
        { title: 'Energized', share: 14 },
      ],
      rows: value.runs.map((run, index) => {
        const isLive = plan.fence?.runs[index]?.energized
        return {
          cells: [
            run.name,
            numberText(run.lengthFt, 1),
            numberText(run.linePosts),
            numberText(run.wireFt),
            isLive ? 'yes' : 'no',
          ],
        }
      }),
    },
    ...[...setback, ...habitat].map((text): Block => ({ kind: 'paragraph', text, size: 'small' })),
  ]
}
