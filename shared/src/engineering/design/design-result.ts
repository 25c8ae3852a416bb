import type { CostEstimate } from '../../money/cost-estimate-result.js'
import type { FundingResult } from '../../money/funding/funding-source.js'
import type { CheckResult } from '../checks/check-result.js'
import type { PartResult } from './part-result.js'
import type {
  ApproachPadValue,
  BermValue,
  ClosingPanelValue,
  EarthworkValue,
  FabricValue,
  FenceValue,
  HerdValue,
  PondValue,
  ProfileValue,
  RockValue,
  RunoffValue,
  SeedingValue,
} from './part-shapes.js'
import type { QuantityLine } from './quantity-line.js'
import type { WorkingFigure } from './working-figure.js'

/**
 * Everything that follows from a design input. A part that failed does not take the others with it, so that the
 * drawing stays on screen while a number is half typed. A ready part of null means: this job has none.
 */
export interface DesignResult {
  herd: PartResult<HerdValue>
  profile: PartResult<ProfileValue>
  earthwork: PartResult<EarthworkValue>
  rock: PartResult<RockValue>
  fabric: PartResult<FabricValue>
  approachPad: PartResult<ApproachPadValue | null>
  closingPanel: PartResult<ClosingPanelValue | null>
  fence: PartResult<FenceValue>
  runoff: PartResult<RunoffValue>
  berm: PartResult<BermValue>
  pond: PartResult<PondValue | null>
  seeding: PartResult<SeedingValue>
  quantities: PartResult<QuantityLine[]>
  cost: PartResult<CostEstimate>
  funding: PartResult<FundingResult>
  checks: CheckResult[]
  working: WorkingFigure[]
  calculationVersion: string
}
