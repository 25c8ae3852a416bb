// The one entry of this package: everything public, by name.
export {
  type CostLine,
  type CostListInput,
  type CostListView,
  costLineSchema,
  costListInputSchema,
} from './schemas/cost-list.js'
export {
  type CriteriaSetInput,
  type CriteriaSetView,
  type Criterion,
  type VersionedStatus,
  criteriaSetInputSchema,
  criterionSchema,
  versionedStatuses,
} from './schemas/criteria.js'
export {
  type DesignPart,
  type DesignPlan,
  animalKinds,
  closingPanelPlanSchema,
  designPlanSchema,
  earthworkPlanSchema,
  fabricPlanSchema,
  herdPlanSchema,
  padPlanSchema,
  pondPlanSchema,
  rampPlanSchema,
  rockLayerSchema,
  rockPlanSchema,
  seedingPlanSchema,
  sitePlanSchema,
  waterBodies,
  waterBodySchema,
} from './schemas/design-plan.js'
export {
  type DesignView,
  type ResolvedWith,
  type SurveyReduction,
  type SurveyView,
  designInputSchema,
} from './schemas/design.js'
export { type ExampleJob, exampleJobSchema } from './schemas/example-job.js'
export {
  type FencePlan,
  fenceKinds,
  fencePlanSchema,
  fenceRoles,
  fenceRunSchema,
} from './schemas/fence-plan.js'
export { type FundingPlan, fundingPlanSchema } from './schemas/funding-plan.js'
export {
  type DeskItem,
  type EventView,
  type JobInput,
  type JobList,
  type JobListItem,
  type JobListQuery,
  type JobView,
  type RevisionItem,
  jobInputSchema,
  jobListQuerySchema,
} from './schemas/job.js'
export {
  type LevelNoteRow,
  type SurveyInput,
  elevationFt,
  groundPointSchema,
  levelClosingSchema,
  levelNoteRowSchema,
  stationFt,
  surveyInputSchema,
} from './schemas/level-notes.js'
export {
  type Act,
  type MailView,
  type NoteInput,
  type NoteView,
  type PacketStatus,
  type PacketView,
  actSchema,
  consentSchema,
  makePacketSchema,
  noteAnswerSchema,
  noteInputSchema,
  packetStatuses,
  readPageSchema,
  technicalCheckSchema,
} from './schemas/packet.js'
export {
  type ApprovalLimits,
  type PersonInput,
  type PersonView,
  type ProducerInput,
  type ProducerView,
  addressSchema,
  approvalLimitsSchema,
  personInputSchema,
  producerInputSchema,
} from './schemas/person.js'
export {
  type Money,
  civilDateSchema,
  emailSchema,
  idSchema,
  instantSchema,
  lineOfText,
  moneySchema,
  numberBetween,
  paragraph,
  rateSchema,
  sha256Schema,
} from './schemas/primitives.js'
export {
  type ScheduleInput,
  type ScheduleLine,
  type ScheduleListItem,
  type ScheduleView,
  mapScheduleLinesSchema,
  scheduleInputSchema,
  scheduleLineSchema,
  sourceKinds,
} from './schemas/schedule.js'
export {
  type DistrictMembership,
  type DistrictView,
  type SessionListItem,
  type SessionView,
  changePasswordSchema,
  chooseDistrictSchema,
  enterCodeSchema,
  openLinkSchema,
  signInSchema,
} from './schemas/session.js'
export {
  type SettingValue,
  type SettingView,
  type SettingsView,
  settingValueSchema,
  settingsInputSchema,
} from './schemas/settings.js'
export {
  bermCovers,
  bermPlanSchema,
  bermSoils,
  rainfallDistributions,
  runoffPlanSchema,
} from './schemas/water-plan.js'
export { actionWords } from './workflow/action-words.js'
export { type OfferedAction, actionsFor } from './workflow/actions-for.js'
export { type Decision, decide } from './workflow/decide.js'
export { type Edge, type JobAction, edges, jobActions } from './workflow/edges.js'
export { type Guard, type GuardName, guards } from './workflow/guards.js'
export type { ActRequest, JobFacts } from './workflow/job-facts.js'
export { type Permission, type Resource, can, permissions, reachOf } from './workflow/permissions.js'
export { type Actor, type Role, roles } from './workflow/roles.js'
export { type JobState, endStates, jobStates, stateWords } from './workflow/states.js'
export { type ProblemSlug, problemCatalogue } from './problems/catalogue.js'
export {
  type FieldProblem,
  Problem,
  type ProblemDocument,
  type ProblemExtras,
  problemDocument,
  problemSlug,
} from './problems/problem.js'
export type { CheckResult, Verdict } from './engineering/checks/check-result.js'
export {
  type DesignInput,
  type DesignInputParts,
  type DesignSetting,
  type DesignSite,
  type GroundLinePoint,
  designInput,
} from './engineering/design/design-input.js'
export { type DesignPartName, designParts } from './engineering/design/design-parts.js'
export type { DesignResult } from './engineering/design/design-result.js'
export type { PartFailed, PartReady, PartResult, PartWaiting } from './engineering/design/part-result.js'
export type {
  ApproachPadValue,
  BermValue,
  ClosingPanelValue,
  FabricDirection,
  FabricValue,
  FenceRunValue,
  FenceValue,
  HerdValue,
  PondValue,
  RockLayerValue,
  RockValue,
  RunoffValue,
  SeedingValue,
} from './engineering/design/part-shapes.js'
export { type QuantityKey, quantityCatalogue, quantityKeys } from './engineering/design/quantity-catalogue.js'
export type { QuantityLine } from './engineering/design/quantity-line.js'
export type {
  EarthSection,
  EarthVolumes,
  EarthworkValue,
  ProfileValue,
  RampPart,
} from './engineering/design/ramp-shapes.js'
export {
  type SettingDefinition,
  type SettingKey,
  settingsCatalogue,
} from './engineering/design/settings-catalogue.js'
export type { WorkingFigure } from './engineering/design/working-figure.js'
export { EngineeringInputError } from './engineering/engineering-input-error.js'
export { type NumberRule, requireNumber } from './engineering/require-number.js'
export type { CostEstimate, CostEstimateLine } from './money/cost-estimate-result.js'
export type {
  FundedLine,
  FundedSource,
  FundingCut,
  FundingResult,
  FundingSource,
  FundingSourceLine,
} from './money/funding-source.js'
