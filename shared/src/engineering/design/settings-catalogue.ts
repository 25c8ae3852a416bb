/**
 * Engineering settings that no publication we know gives a figure for: each district enters its own, with its
 * source. `isNeeded` means that a design cannot be worked out without it; the others only switch a check on.
 */
export interface SettingDefinition {
  key: string
  label: string
  unit: string
  minimum: number
  maximum: number
  isNeeded: boolean
  hint: string
}

const define = (
  isNeeded: boolean,
  key: string,
  label: string,
  [minimum, maximum, unit]: readonly [number, number, string],
  hint: string,
): SettingDefinition => ({ key, label, unit, minimum, maximum, isNeeded, hint })

const needed = define.bind(null, true)
const forCheck = define.bind(null, false)

export const settingsCatalogue = [
  needed(
    'swellPercent',
    'Swell of excavated earth',
    [0, 100, '%'],
    'Loose volume over bank volume, less one.',
  ),
  needed(
    'shrinkPercent',
    'Shrink of compacted earth',
    [0, 50, '%'],
    'Bank volume lost when it is compacted.',
  ),
  needed('bermFreeboardFt', 'Freeboard of the berm', [0, 3, 'ft'], 'Often 0.3 ft; from memory, verify.'),
  needed('bermSettlementPercent', 'Settlement of the berm', [0, 50, '%'], 'Often 10 %; from memory, verify.'),
  forCheck(
    'approachGradeRunPerRise',
    'Grade of the approach',
    [2, 40, 'run per rise'],
    'Earth landward of the ramp top meets the ground at this grade. Left empty: 10 : 1.',
  ),
  forCheck(
    'approachGradeMinRunPerRise',
    'Steepest approach allowed',
    [2, 40, 'run per rise'],
    'The lane down to the ramp must be this flat or flatter.',
  ),
  forCheck(
    'spoilSpreadDepthIn',
    'Depth of spread spoil',
    [1, 36, 'in'],
    'Gives the ground that wet spoil will cover.',
  ),
  forCheck(
    'stackLimitPercent',
    'All funds together',
    [0, 100, '% of cost'],
    'Left empty: 100 %. It can be lower, never higher.',
  ),
  forCheck(
    'topAboveFullPoolMinFt',
    'Least height of the ramp top above full pool',
    [0, 20, 'ft'],
    'Waves, ice and settlement.',
  ),
  forCheck(
    'topAboveFloodPoolMinFt',
    'Least height of the ramp top above flood pool',
    [0, 20, 'ft'],
    'Below this the ramp top is flooded in a storm.',
  ),
  forCheck(
    'rimFreeboardFt',
    'Rim above flood pool',
    [0, 20, 'ft'],
    'The approach must not become a spillway. Used where the top of dam is not known.',
  ),
  forCheck('toePitMaxFt', 'Toe below the bed at most', [0, 5, 'ft'], 'Common practice: 0.5 ft.'),
  forCheck('toeHangMaxFt', 'Toe above the bed at most', [0, 5, 'ft'], 'Common practice: 0.5 ft.'),
  forCheck(
    'depthAtClosingPanelMaxFt',
    'Deepest water at a closing panel on posts',
    [1, 12, 'ft'],
    'Deeper water needs a float.',
  ),
  forCheck('damSetbackMinFt', 'Least distance to the dam', [0, 1000, 'ft'], 'From ramp and lane to the toe.'),
  forCheck('spillwaySetbackMinFt', 'Least distance to a spillway', [0, 1000, 'ft'], 'From ramp and lane.'),
  forCheck('inflowSetbackMinFt', 'Least distance to an inflow', [0, 1000, 'ft'], 'From ramp and lane.'),
  forCheck('bermPastRampMinFt', 'Berm past the edge of the rock', [0, 100, 'ft'], 'On both sides.'),
  forCheck('bermOutletToRampMinFt', 'Berm outlet to ramp', [0, 1000, 'ft'], 'Runoff must not come back.'),
  forCheck('rockThicknessCautionIn', 'Thin rock', [0, 36, 'in'], 'Common practice: 12 in on soft banks.'),
  forCheck('gateWidthMinFt', 'Least gate width', [3, 40, 'ft'], 'For the machine that renews the stone.'),
  forCheck('habitatAreaMinAcres', 'Least area set aside', [0, 100, 'acres'], 'Fenced, less water and lane.'),
] as const satisfies readonly SettingDefinition[]

export type SettingKey = (typeof settingsCatalogue)[number]['key']
