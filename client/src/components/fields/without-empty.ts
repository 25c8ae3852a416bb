/** What is left when emptied fields are taken out, at any depth: as the value would be sent. */
export function withoutEmpty(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(withoutEmpty)
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, inner]) => inner !== undefined && inner !== null)
      .map(([key, inner]) => [key, withoutEmpty(inner)]),
  )
}
