import { settingsCatalogue, type Criterion, type FieldProblem } from 'shared'

const settingKeys: ReadonlySet<string> = new Set(settingsCatalogue.map(({ key }) => key))

type Limit = Criterion['limit']

const isSetting = (limit: Limit): limit is { setting: string } =>
  limit !== null && typeof limit === 'object' && !Array.isArray(limit)

/** A figure, the one a district enters, or none: then it follows from the design itself. */
const isOneFigure = (limit: Limit): boolean => limit === null || typeof limit === 'number' || isSetting(limit)

/** What each comparison can be held against, and what to say of anything else. */
const limitOf: Readonly<
  Record<Criterion['comparison'], { fits: (limit: Limit) => boolean; wanted: string }>
> = {
  'at-least': { fits: isOneFigure, wanted: 'Give one number, or the setting that holds it.' },
  'at-most': { fits: isOneFigure, wanted: 'Give one number, or the setting that holds it.' },
  between: {
    fits: (limit) => Array.isArray(limit) && limit[0] <= limit[1],
    wanted: 'Give two numbers, the lower one first.',
  },
  yes: { fits: (limit) => limit === null, wanted: 'A question of yes or no has no limit. Leave it empty.' },
}

/** What stands against a criteria set, beside the field it stands in. */
export function criterionProblems(criteria: readonly Criterion[]): FieldProblem[] {
  const ids = criteria.map(({ id }) => id)
  return criteria.flatMap((criterion, index) => {
    const { id, title } = criterion
    const isTwice = ids.indexOf(id) !== index
    const idMessage = isTwice ? `Two criteria have the id "${id}". Give "${title}" another.` : null
    const limitMessage = limitProblem(criterion)
    return [
      ...(idMessage === null ? [] : [{ pointer: `/criteria/${index}/id`, message: idMessage }]),
      ...(limitMessage === null ? [] : [{ pointer: `/criteria/${index}/limit`, message: limitMessage }]),
    ]
  })
}

function limitProblem({ title, comparison, limit }: Criterion): string | null {
  const { fits, wanted } = limitOf[comparison]
  if (!fits(limit)) return `The limit of "${title}" does not fit its comparison. ${wanted}`
  if (isSetting(limit) && !settingKeys.has(limit.setting)) {
    return `"${title}" takes its limit from the setting "${limit.setting}", which there is not.`
  }
  return null
}
