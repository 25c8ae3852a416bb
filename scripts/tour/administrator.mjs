/** Puts in the figures that no publication gives, and puts costs and schedules in force. */
export async function prepareDistrict({ api, example, record }) {
  const before = await api.get('/settings')
  const settings = await api.put('/settings', { settings: example.settings }, before.version)
  const stillEmpty = settings.settings.filter(({ isNeeded, value }) => isNeeded && value === null)
  if (stillEmpty.length > 0) {
    throw new Error(`Needed settings are still empty: ${stillEmpty.map(({ label }) => label).join(', ')}.`)
  }
  record.step(
    'administrator',
    'enters the district settings',
    `${example.settings.length} with source and date`,
  )

  const costList = await api.post('/cost-lists', example.costList)
  await api.act(`/cost-lists/${costList.id}/put-in-force`)
  record.step(
    'administrator',
    'puts the cost list in force',
    `${costList.lines.length} lines, ${costList.name}`,
  )

  for (const input of example.schedules) {
    const schedule = await api.post('/schedules', input)
    const inForce = await api.act(`/schedules/${schedule.id}/put-in-force`)
    const mapped = inForce.lines.filter(({ quantityKey }) => quantityKey !== null).length
    record.step(
      'administrator',
      `puts the schedule in force: ${inForce.name}`,
      `${mapped} of ${inForce.lines.length} lines mapped`,
    )
  }
}
