import type { CostEstimate } from '../../money/cost-estimate-result.js'
import type { FundingResult } from '../../money/funding/funding-source.js'
import type { CheckResult } from '../checks/check-result.js'
import type { ClosingPanel } from '../ramp/closing-panel.js'
import type { RampEarthwork } from '../ramp/ramp-earthwork.js'
import type { RampProfile } from '../ramp/ramp-profile.js'
import type { DesignPartName } from './design-parts.js'
import type { PartResult } from './part-result.js'
import type {
  ApproachPadValue,
  BermValue,
  FabricValue,
  FenceValue,
  HerdValue,
  PondValue,
  RockValue,
  RunoffValue,
  SeedingValue,
} from './part-shapes.js'
import type { QuantityLine } from './quantity-line.js'
import type { WorkingFigure } from './working-figure.js'

/** What each part comes to. Null means: this job has none. */
export interface PartValues {
  herd: HerdValue
  profile: RampProfile
  earthwork: RampEarthwork
  rock: RockValue
  fabric: FabricValue
  approachPad: ApproachPadValue | null
  closingPanel: ClosingPanel | null
  fence: FenceValue
  runoff: RunoffValue
  berm: BermValue
  pond: PondValue | null
  seeding: SeedingValue
}

/** A part that failed does not take the others with it, so that the drawing stays while a number is half typed. */
export type DesignPartResults = { [Part in DesignPartName]: PartResult<PartValues[Part]> }

/** Everything that follows from a design input. */
export interface DesignResult extends DesignPartResults {
  quantities: PartResult<QuantityLine[]>
  cost: PartResult<CostEstimate>
  funding: PartResult<FundingResult>
  checks: CheckResult[]
  working: WorkingFigure[]
  calculationVersion: string
}
