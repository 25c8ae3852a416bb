import { quantityKeys, type CostLine, type FieldProblem } from 'shared'

const known: ReadonlySet<string> = new Set(quantityKeys)

/** What stands against the lines of a cost list, beside the field it stands in. */
export function costLineProblems(lines: readonly CostLine[]): FieldProblem[] {
  const keys = lines.map(({ key }) => key)
  return lines.flatMap((line, index) => {
    const { key } = line
    const pointer = `/lines/${index}`
    if (!known.has(key)) {
      const message = `No quantity is called "${key}". The quantities are ${quantityKeys.join(', ')}.`
      return [{ pointer: `${pointer}/key`, message }]
    }
    if (keys.indexOf(key) !== index) {
      return [{ pointer: `${pointer}/key`, message: `The list prices ${key} twice. Keep one of the lines.` }]
    }
    return outOfOrder(line).map(({ field, message }) => ({ pointer: `${pointer}/${field}`, message }))
  })
}

/** A rate has fourteen digits at most, and a double keeps the order of those. */
function outOfOrder({ key, low, typical, high }: CostLine): { field: keyof CostLine; message: string }[] {
  const order = 'Low, typical and high go upward.'
  const found: { field: keyof CostLine; message: string }[] = []
  if (Number(typical) < Number(low)) {
    found.push({
      field: 'typical',
      message: `The typical price of ${key}, ${typical}, is below its low one, ${low}. ${order}`,
    })
  }
  if (Number(high) < Number(typical)) {
    found.push({
      field: 'high',
      message: `The high price of ${key}, ${high}, is below its typical one, ${typical}. ${order}`,
    })
  }
  return found
}
