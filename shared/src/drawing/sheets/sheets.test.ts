import { describe, expect, it } from 'vitest'
import { northPondDesign } from '../../../examples/north-pond-design.js'
import type { DesignPlan } from '../../schemas/design-plan.js'
import { boundsOf, boxesOverlap, holdsPoint, insetBox } from '../geometry/boxes.js'
import type { SheetTitle } from '../marks/title-block.js'
import { sheetModel, type SheetModel } from '../sheet-model.js'
import type { Box, Point, Shape, Sheet, TextShape } from '../shapes.js'
import { textBox, textCorners } from '../text-box.js'
import { crossSectionsSheet } from './cross-sections-sheet.js'
import { detailsSheet } from './details-sheet.js'
import { planSheet } from './plan-sheet.js'
import { profileFigure } from './profile-figure.js'
import { profileSheet } from './profile-sheet.js'

const title: SheetTitle = {
  district: 'Sable Basin Conservation District',
  jobTitle: 'Marchbank, north pond',
  jobNumber: '26-014',
  revision: 1,
  sheetNumber: 3,
  sheetCount: 14,
  designedBy: 'A planner',
  designedOn: '14 May 2026',
  checkedBy: 'not yet',
  levels: 'full pool = 100.00 ft, local',
  isExample: true,
}

const changed = (part: Partial<DesignPlan>) => (plan: DesignPlan) => ({ ...plan, ...part })
const without = (key: keyof DesignPlan) => (plan: DesignPlan) => {
  const rest: Partial<DesignPlan> = { ...plan }
  delete rest[key]
  return rest as DesignPlan
}
const rampOf = (ramp: Partial<NonNullable<DesignPlan['ramp']>>) => (plan: DesignPlan) =>
  plan.ramp ? { ...plan, ramp: { ...plan.ramp, ...ramp } } : plan

const jobs: { [name: string]: (plan: DesignPlan) => DesignPlan } = {
  'the north pond': (plan) => plan,
  'a steep ramp': rampOf({ gradeRunPerRise: 6 }),
  'a narrow ramp with apron and landing': rampOf({ widthFt: 12, apronLengthFt: 5, landingLengthFt: 6 }),
  'a ramp without pad': without('pads'),
  'a ramp without berm': without('berm'),
  'a ramp without fence': without('fence'),
  'a ramp without closing panel': without('closingPanel'),
  'a ramp whose rock is not chosen yet': without('rock'),
  'a job without anything but the ramp': (plan) => ({ inputVersion: 1, ...pick(plan) }),
}
const pick = ({ site, ramp }: DesignPlan) => ({ ...(site ? { site } : {}), ...(ramp ? { ramp } : {}) })

const modelOf = (change: (plan: DesignPlan) => DesignPlan): SheetModel => {
  const model = sheetModel(northPondDesign(change))
  if (!model) throw new Error('The ramp of this job should be worked out')
  return model
}

const makers: { [name: string]: (model: SheetModel) => Sheet } = {
  profile: (model) => profileSheet(model, title),
  'cross sections': (model) => crossSectionsSheet(model, title),
  plan: (model) => planSheet(model, title),
  details: (model) => detailsSheet(model, title),
  figure: (model) => profileFigure({ model, widthMm: 220, heightMm: 95 }),
}

const cases = Object.entries(jobs).flatMap(([job, change]) =>
  Object.entries(makers).map(([sheet, make]) => ({ job, sheet, drawn: () => make(modelOf(change)) })),
)

const pointsOf = (shape: Shape): Point[] => {
  if (shape.kind === 'text') return textCorners(shape)
  return shape.kind === 'polyline' ? shape.lines.flat() : shape.rings.flat()
}
const textsOf = (sheet: Sheet) => sheet.shapes.filter((shape): shape is TextShape => shape.kind === 'text')
const clipOf = (sheet: Sheet, shape: Shape): Box =>
  sheet.views.find(({ key }) => key === shape.view)?.clip ?? sheet.border

describe('every sheet', () => {
  it.each(cases)('keeps every point inside its view or border: $sheet of $job', ({ drawn }) => {
    const sheet = drawn()
    const outside = sheet.shapes.flatMap((shape) =>
      pointsOf(shape)
        .filter((point) => !holdsPoint(clipOf(sheet, shape), point, 0.01))
        .map((point) => ({ shape: shape.kind === 'text' ? shape.text : (shape.id ?? shape.kind), point })),
    )
    expect(outside).toEqual([])
  })

  it.each(cases)('never lets two labels overlap: $sheet of $job', ({ drawn }) => {
    const texts = textsOf(drawn()).filter(({ angleDeg }) => !angleDeg)
    const boxes = texts.map((text) => ({ text: text.text, box: insetBox(textBox(text), 0.2) }))
    const clashes = boxes.flatMap((one, index) =>
      boxes
        .slice(index + 1)
        .filter((other) => boxesOverlap(one.box, other.box))
        .map((other) => [one.text, other.text]),
    )
    expect(clashes).toEqual([])
  })

  it.each(cases)('prints no figure that is not a number: $sheet of $job', ({ drawn }) => {
    const sheet = drawn()
    const words = [
      ...textsOf(sheet).map(({ text }) => text),
      ...sheet.words,
      ...sheet.table.rows.flat(),
    ].join('\n')
    expect(words).not.toMatch(/NaN|undefined|Infinity/)
    const numbers = sheet.shapes.flatMap(pointsOf).flatMap(({ x, y }) => [x, y])
    expect(numbers.every(Number.isFinite)).toBe(true)
  })

  it.each(cases)('draws a scale bar as long as it says: $sheet of $job', ({ drawn }) => {
    const sheet = drawn()
    sheet.views.forEach((view) => {
      const bar = sheet.shapes.filter(({ id }) => id === `scale-bar-${view.key}`).flatMap(pointsOf)
      if (bar.length === 0) return
      const { left, right, top } = boundsOf(bar)
      const label = textsOf(sheet).find(
        ({ text, at }) => / ft$/.test(text) && Math.abs(at.x - right) < 0.01 && at.y < top,
      )
      expect(right - left).toBeCloseTo(parseFloat(label?.text ?? '') * view.horizontalMmPerFt, 6)
    })
  })

  it.each(cases)('says the exaggeration that it draws: $sheet of $job', ({ drawn }) => {
    drawn().views.forEach(({ scaleNote, horizontalMmPerFt, verticalMmPerFt }) => {
      if (horizontalMmPerFt === 0) return expect(scaleNote).toBe('not to scale')
      const said = /exaggeration ([\d.]+)×/.exec(scaleNote)?.[1]
      expect(verticalMmPerFt / horizontalMmPerFt).toBeCloseTo(said ? Number(said) : 1, 9)
      if (!said) expect(scaleNote).toContain('true shape')
    })
  })

  it.each(cases)('is the same each time: $sheet of $job', ({ drawn }) => {
    expect(drawn()).toEqual(drawn())
  })
})

describe('the profile sheet', () => {
  it.each([6, 8, 10])('draws the finished surface at the grade it writes, %s to 1', (gradeRunPerRise) => {
    const sheet = profileSheet(modelOf(rampOf({ gradeRunPerRise })), title)
    const view = sheet.views[0]
    const line = sheet.shapes.find((shape) => shape.id === 'finished' && shape.view === 'profile')
    const [top, toe] = line?.kind === 'polyline' ? (line.lines[0] ?? []).slice(-2) : []
    if (!view || !top || !toe) throw new Error('The finished surface is not drawn')
    const run = (toe.x - top.x) / view.horizontalMmPerFt
    const rise = (toe.y - top.y) / view.verticalMmPerFt
    expect(run / rise).toBeCloseTo(gradeRunPerRise, 6)
    const label = textsOf(sheet).find(({ id }) => id === 'grade-label')
    expect(label?.text).toContain(`${gradeRunPerRise}\u00a0:\u00a01`)
  })

  it('tables the stations it draws, with finished less existing', () => {
    const { table } = profileSheet(
      modelOf((plan) => plan),
      title,
    )
    const top = table.rows.find(([, place]) => place === 'ramp top')
    const toe = table.rows.find(([, place]) => place === 'toe')
    expect(top).toEqual(['0+43.6', 'ramp top', '101.50', '101.50', '0.00'])
    expect(toe).toEqual(['0+99.6', 'toe', '94.50', '94.63', '−0.13'])
  })

  it('never draws an energized wire in the water, and says so', () => {
    const sheet = profileSheet(
      modelOf((plan) => plan),
      title,
    )
    expect(textsOf(sheet).map(({ text }) => text)).toContain('closing panel, no current')
  })
})

describe('the cross sections sheet', () => {
  it('shows three sections or more, at stations of the earthwork', () => {
    const model = modelOf((plan) => plan)
    const sheet = crossSectionsSheet(model, title)
    expect(sheet.views.length).toBeGreaterThanOrEqual(3)
    expect(new Set(sheet.views.map(({ horizontalMmPerFt }) => horizontalMmPerFt)).size).toBe(1)
  })

  it('draws cut and fill with the areas that the earthwork pays for', () => {
    const model = modelOf((plan) => plan)
    const sheet = crossSectionsSheet(model, title)
    model.earthwork?.sections
      .filter(({ part }) => part === 'ramp')
      .forEach((section) => {
        const drawn = sheet.shapes.find(({ id }) => id === `section-${section.stationFt}`)
        const view = sheet.views.find(({ key }) => key === drawn?.view)
        if (!view || drawn?.kind !== 'polyline') return
        // The finished line meets the ground at the outer ends of the dug or filled sides: B + 2·s·d apart.
        const depth = Math.abs(section.groundFt - section.formationFt)
        const ends = (drawn.lines[0] ?? []).slice(1, -1)
        const width = ((ends.at(-1)?.x ?? 0) - (ends[0]?.x ?? 0)) / view.horizontalMmPerFt
        const meanWidth = ((model.earthwork?.formationWidthFt ?? 0) + width) / 2
        expect(meanWidth * depth).toBeCloseTo(section.cutAreaFt2 + section.fillAreaFt2, 6)
      })
    expect.hasAssertions()
  })
})

describe('the plan sheet', () => {
  it('takes the place of the ramp from the corners of the closing panel', () => {
    const sheet = planSheet(
      modelOf((plan) => plan),
      title,
    )
    expect(sheet.words).toContain('North is up.')
  })

  it('says that the place is not known when no line on the map shows it', () => {
    const sheet = planSheet(modelOf(without('fence')), title)
    expect(sheet.words).toContain('Where the ramp lies on the map is not known yet.')
  })

  it('points its north arrow up the sheet', () => {
    const arrow = planSheet(
      modelOf((plan) => plan),
      title,
    ).shapes.find(({ id }) => id === 'north-arrow')
    const [tip, ...rest] = arrow ? pointsOf(arrow) : []
    expect(rest.every(({ y }) => y > (tip?.y ?? Infinity))).toBe(true)
  })
})

describe('a design without a ramp', () => {
  it('has no sheet model', () => {
    expect(sheetModel(northPondDesign(changed({ ramp: undefined })))).toBeNull()
  })
})
