const money = (value) => ({ value, unit: 'USD' })

/** Every figure of a design with its unit, as the server worked it out, under one flat list of names. */
export function figuresOf({ working, quantities, cost, funding }) {
  const figures = {}
  for (const { part, key, result, unit } of working) figures[`${part}.${key}`] = { value: result, unit }
  for (const { key, quantity, unit } of quantities.value)
    figures[`quantities.${key}`] = { value: quantity, unit }
  for (const { key, typical } of cost.value.lines) figures[`cost.${key}`] = money(typical)
  for (const bound of ['low', 'typical', 'high']) figures[`cost.${bound}`] = money(cost.value[bound])
  for (const { key, offered, paid } of funding.value.sources) {
    figures[`funding.${key}.offered`] = money(offered)
    figures[`funding.${key}.paid`] = money(paid)
  }
  figures['funding.totalPaid'] = money(funding.value.totalPaid)
  figures['funding.landownerShare'] = money(funding.value.landownerShare)
  return figures
}
