import type { GroundLinePoint } from '../engineering/design/design-input.js'
import type { DesignResult } from '../engineering/design/design-result.js'
import type { PartResult } from '../engineering/design/part-result.js'
import type {
  ApproachPadValue,
  BermValue,
  ClosingPanelValue,
  EarthworkValue,
  FabricValue,
  FenceValue,
  ProfileValue,
} from '../engineering/design/part-shapes.js'
import type { DesignPlan } from '../schemas/design-plan.js'

type Plan<Part extends keyof DesignPlan> = NonNullable<DesignPlan[Part]>

export interface LayerFigure {
  name: string
  role: 'surface' | 'base'
  stoneSizeIn: number
  thicknessIn: number
  topFt: number
  bottomFt: number
}

/** What the sheets draw: the parts that are ready, joined with what was chosen for them. */
export interface SheetModel {
  ground: GroundLinePoint[]
  site: Plan<'site'>
  ramp: Plan<'ramp'>
  profile: ProfileValue
  layers: LayerFigure[]
  edgeRunPerRise: number
  earthwork: (EarthworkValue & Plan<'earthwork'>) | null
  fabric: { value: FabricValue; plan: Plan<'fabric'> } | null
  pad: (ApproachPadValue & { thicknessIn: number }) | null
  berm: { value: BermValue; plan: Plan<'berm'> } | null
  closing: { value: ClosingPanelValue; plan: Plan<'closingPanel'>; stationFt: number } | null
  fence: { value: FenceValue | null; plan: Plan<'fence'> } | null
}

export interface SheetModelInput {
  plan: DesignPlan
  result: DesignResult
  groundLine: GroundLinePoint[]
}

/** Null while there is no ramp to draw: without levels, ground or ramp figures a sheet would say nothing. */
export function sheetModel({ plan, result, groundLine }: SheetModelInput): SheetModel | null {
  const profile = readyValue(result.profile)
  if (!profile || !plan.site || !plan.ramp || groundLine.length < 2) return null
  const earthwork = readyValue(result.earthwork)
  const pad = readyValue(result.approachPad)
  const fabric = readyValue(result.fabric)
  const berm = readyValue(result.berm)
  const closing = readyValue(result.closingPanel)
  return {
    ground: groundLine,
    site: plan.site,
    ramp: plan.ramp,
    profile,
    layers: layersOf(plan),
    edgeRunPerRise: plan.rock?.edgeRunPerRise ?? 0,
    earthwork: earthwork && plan.earthwork ? { ...earthwork, ...plan.earthwork } : null,
    fabric: fabric && plan.fabric ? { value: fabric, plan: plan.fabric } : null,
    pad: pad && plan.pads?.approach ? { ...pad, thicknessIn: plan.pads.approach.thicknessIn } : null,
    berm: berm && plan.berm ? { value: berm, plan: plan.berm } : null,
    closing: closing && plan.closingPanel ? closingOf(closing, plan.closingPanel, profile) : null,
    fence: plan.fence ? { value: readyValue(result.fence), plan: plan.fence } : null,
  }
}

/** The value of a part that could be worked out, else null. */
export const readyValue = <Value>(part: PartResult<Value>): Value | null => (part.ok ? part.value : null)

const closingOf = (value: ClosingPanelValue, plan: Plan<'closingPanel'>, profile: ProfileValue) => ({
  value,
  plan,
  stationFt: profile.toeStationFt + plan.beyondToeFt,
})

function layersOf(plan: DesignPlan): LayerFigure[] {
  let topFt = 0
  return (plan.rock?.layers ?? []).map(({ name, role, stoneSizeIn, thicknessIn }) => {
    const bottomFt = topFt + thicknessIn / 12
    const layer = { name, role, stoneSizeIn, thicknessIn, topFt, bottomFt }
    topFt = bottomFt
    return layer
  })
}
