export type LimitedMethod = 'lag' | 'graphical' | 'rational'

export type LimitedField =
  'areaAcres' | 'curveNumber' | 'flowLengthFt' | 'landSlopePercent' | 'timeOfConcentrationHr'

export interface MethodLimit {
  method: LimitedMethod
  field: LimitedField
  unit: string
  min?: number
  max?: number
  exclusiveMin?: number
  exclusiveMax?: number
  source: string
  /** A limit nobody here has read in print: crossing it gives a note, never a refusal. */
  fromMemory: boolean
}

const TR55 = 'USDA NRCS, TR-55, 2nd ed., June 1986, ch. 4'
const HEC22 = 'FHWA HEC-22, 4th ed., Feb 2024, ch. 4'
const EFH2 = 'small-watershed method of the Engineering Field Handbook, ch. 2: from memory, verify'

/** Limits of use of the runoff methods. A district may hold its own beside these. */
export const methodLimits: readonly MethodLimit[] = [
  { method: 'graphical', field: 'curveNumber', unit: '', exclusiveMin: 40, source: TR55, fromMemory: false },
  {
    method: 'graphical',
    field: 'timeOfConcentrationHr',
    unit: 'h',
    max: 10,
    source: TR55,
    fromMemory: false,
  },
  {
    method: 'rational',
    field: 'areaAcres',
    unit: 'acres',
    exclusiveMax: 200,
    source: HEC22,
    fromMemory: false,
  },
  { method: 'lag', field: 'flowLengthFt', unit: 'ft', min: 200, max: 26000, source: EFH2, fromMemory: true },
  {
    method: 'lag',
    field: 'landSlopePercent',
    unit: 'percent',
    min: 0.5,
    max: 64,
    source: EFH2,
    fromMemory: true,
  },
  { method: 'lag', field: 'curveNumber', unit: '', min: 40, max: 98, source: EFH2, fromMemory: true },
  { method: 'lag', field: 'areaAcres', unit: 'acres', max: 2000, source: EFH2, fromMemory: true },
]
