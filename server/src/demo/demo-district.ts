import type {
  ApprovalLimits,
  CostListInput,
  DesignPlan,
  JobInput,
  ProducerInput,
  Role,
  ScheduleInput,
  SettingValue,
  SurveyInput,
} from 'shared'
import type { DemoState } from './paths.js'

/** Somebody of the office. Landowners come by a mailed link and have no password. */
export interface DemoPerson {
  name: string
  email: string
  role: Exclude<Role, 'landowner'>
  approvalLimits: ApprovalLimits | null
}

export interface DemoDesign {
  name: string
  plan: DesignPlan
}

export interface DemoJob {
  /** A title is used once in a district: a seeding that was cut short finds its jobs by it. */
  job: Omit<JobInput, 'producerIds'>
  producer: ProducerInput
  survey?: SurveyInput
  /** The first is the chosen one. */
  designs: DemoDesign[]
  /** Where the job is brought. */
  state: DemoState
  /** What the landowner asks for, or why the job is withdrawn. */
  words?: string
}

/** Prices and rates by the year in which the district is made, so that they are in force whenever that is. */
export interface DemoRules {
  settings: SettingValue[]
  costList: (year: number) => CostListInput
  schedules: (year: number) => ScheduleInput[]
}

export interface DemoDistrict {
  name: string
  timeZone: string
  fiscalYearStartMonth: number
  jobNumberPrefix: string
  /** Two planners: the second makes the technical checks. */
  people: DemoPerson[]
  rules: DemoRules
  jobs: DemoJob[]
}
