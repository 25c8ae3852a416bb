import { formatStation, numberText, readyValue, settingsCatalogue, stationLabel, trimmedNumber } from 'shared'
import type { Block, PageDraft, TableColumn } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'

const number = (title: string, share = 12): TableColumn => ({ title, share, align: 'right' })

/** The survey as it was booked, and the sections of the earthwork. */
export function groundPage(source: PacketSource): PageDraft {
  return {
    title: 'Appendix: ground and earthwork',
    blocks: [...notes(source), ...sections(source), ...settings(source)],
  }
}

function notes({ survey }: PacketSource): Block[] {
  if (survey.survey.kind !== 'level-notes') {
    return [
      { kind: 'heading', text: 'Ground line' },
      {
        kind: 'table',
        columns: [{ title: 'Station', share: 30 }, number('Elevation, ft', 30)],
        rows: survey.groundLine.map((point) => ({
          cells: [stationLabel(point.stationFt), numberText(point.elevationFt, 2)],
        })),
      },
    ]
  }
  const sight = (value: number | undefined) => (value === undefined ? '' : numberText(value, 2))
  const points = survey.reduction?.points ?? []
  return [
    { kind: 'heading', text: 'Level notes' },
    {
      kind: 'table',
      columns: [
        { title: 'Point', share: 26 },
        { title: 'Station', share: 12 },
        number('Backsight'),
        number('Between'),
        number('Foresight'),
        number('Instrument'),
        number('Elevation'),
      ],
      rows: survey.survey.rows.map((row, index) => {
        const point = points[index]
        const station = row.stationFt === undefined ? '' : formatStation({ stationFt: row.stationFt })
        return {
          cells: [
            row.label,
            station,
            sight(row.backsightFt),
            sight(row.intermediateFt),
            sight(row.foresightFt),
            sight(point?.instrumentHeightFt),
            sight(point?.elevationFt),
          ],
        }
      }),
    },
  ]
}

function sections({ result }: PacketSource): Block[] {
  const earthwork = readyValue(result.earthwork)
  if (!earthwork) return []
  const { averageEndArea: pay, prismoidal } = earthwork
  const volume = (name: string, key: keyof typeof pay) => ({
    cells: [name, numberText(pay[key], 2), numberText(prismoidal[key], 2)],
  })
  return [
    { kind: 'heading', text: 'Sections of the earthwork' },
    {
      kind: 'table',
      columns: [
        { title: 'Station', share: 13 },
        number('Ground'),
        number('Finished'),
        number('Bottom of rock'),
        number('Cut ft²'),
        number('of it wet'),
        number('Fill ft²'),
        number('Backfill ft²'),
      ],
      rows: earthwork.sections.map((section) => ({
        cells: [
          stationLabel(section.stationFt),
          ...[section.groundFt, section.finishedFt, section.formationFt].map((value) => numberText(value, 2)),
          ...[
            section.cutAreaFt2,
            section.wetCutAreaFt2,
            section.fillAreaFt2,
            section.edgeBackfillAreaFt2,
          ].map((value) => numberText(value, 2)),
        ],
      })),
    },
    {
      kind: 'table',
      columns: [
        { title: 'Volume', share: 40 },
        number('Average end area, yd³', 25),
        number('Prismoidal, yd³', 25),
      ],
      rows: [
        volume('Cut', 'cutYd3'),
        volume('of it under water', 'wetCutYd3'),
        volume('Fill', 'fillYd3'),
        volume('Earth put back beside the rock', 'edgeBackfillYd3'),
      ],
    },
  ]
}

function settings({ settings: all }: PacketSource): Block[] {
  const entered = all.filter(({ value }) => value !== null)
  if (entered.length === 0) return []
  return [
    { kind: 'heading', text: 'Settings of the district' },
    {
      kind: 'table',
      columns: [{ title: 'Setting', share: 44 }, number('Value', 14), { title: 'Source', share: 42 }],
      rows: entered.map(({ key, value, source, sourceDate }) => ({
        cells: [labelOf(key), valueText(key, value ?? 0), `${source}, ${sourceDate}`],
      })),
    },
  ]
}

const definitionOf = (key: string) => settingsCatalogue.find((setting) => setting.key === key)

const labelOf = (key: string): string => definitionOf(key)?.label ?? key

const valueText = (key: string, value: number) =>
  `${trimmedNumber(value, 4)} ${definitionOf(key)?.unit ?? ''}`.trim()
