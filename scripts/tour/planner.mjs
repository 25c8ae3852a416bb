import { promise, sha256 } from './record.mjs'

export async function openJob({ api, example, record }) {
  const known = await api.get(`/producers?find=${encodeURIComponent(example.producer.email)}`)
  const producer =
    known.find(({ email }) => email === example.producer.email) ??
    (await api.post('/producers', example.producer))
  const job = await api.post('/jobs', { ...example.job, producerIds: [producer.id] })
  record.step('planner', `opens the job for ${producer.name}`, job.number)
  record.state(job, 'draft')
  return job
}

export async function survey({ api, job, example, notesName, notesText, record }) {
  const { rows, errors } = await api.upload('/surveys/read-csv', notesName, notesText)
  promise(
    errors.length === 0,
    `The level notes have errors: ${errors.map(({ row, column, message }) => `row ${row}, ${column}: ${message}`).join('; ')}`,
  )
  const { startElevationFt, waterSurfaceFt, closing } = example.survey
  const saved = await api.put(
    `/jobs/${job.id}/survey`,
    { kind: 'level-notes', startElevationFt, waterSurfaceFt, closing, rows },
    0,
  )
  const { reduction } = saved
  promise(reduction.arithmeticCheckPasses, 'The arithmetic check of the level notes does not pass.')
  promise(reduction.closes !== false, `The level notes do not close: ${reduction.misclosureFt} ft.`)
  record.step(
    'planner',
    'enters the level notes',
    `${rows.length} rows, misclosure ${reduction.misclosureFt?.toFixed(2)} ft`,
  )
  return saved
}

export async function design({ api, job, plan, record }) {
  const made = await api.post(`/jobs/${job.id}/designs`, { name: 'First design', plan })
  await api.post(`/designs/${made.id}/choose`)
  tellDesign(made, record)
  return made
}

export async function change({ api, designId, plan, why, record }) {
  const now = await api.get(`/designs/${designId}`)
  const saved = await api.put(`/designs/${designId}`, { name: now.name, plan }, now.version)
  record.step('planner', why, `landowner's share $${saved.result.funding.value?.landownerShare}`)
  return saved
}

function tellDesign({ result }, record) {
  const unfit = Object.entries(result).filter(([, part]) => part?.ok === false)
  promise(
    unfit.length === 0,
    `The design is not complete: ${unfit.map(([name, part]) => `${name}: ${part.message ?? `waits for ${part.waitingFor}`}`).join('; ')}`,
  )
  const failing = result.checks.filter(({ verdict }) => verdict === 'fail')
  promise(
    failing.length === 0,
    `Checks fail: ${failing.map(({ title, actual, limit }) => `${title} (${actual}, limit ${limit})`).join('; ')}`,
  )
  const { rock, cost, funding } = result
  record.step(
    'planner',
    'designs ramp, rock, fabric, fence and berm',
    `${rock.value.totalOrderTons.toFixed(2)} tons of stone`,
  )
  record.step('planner', 'prices it', `$${cost.value.typical}`)
  const paid = funding.value.sources.map(({ key, paid: amount }) => `${key} $${amount}`).join(', ')
  record.step('planner', 'works out the cost-share', `${paid}; landowner $${funding.value.landownerShare}`)
}

/** Waits until the queue has made a packet, and holds the stored bytes against the hash the server reports. */
export async function waitForPacket({ api, packetId, record }) {
  for (let tries = 0; tries < 600; tries += 1) {
    const packet = await api.get(`/packets/${packetId}`)
    if (packet.status === 'failed')
      throw new Error(`The packet of revision ${packet.revision} could not be made.`)
    if (packet.status === 'ready') {
      const bytes = await api.bytes(`/packets/${packetId}/file`)
      promise(
        sha256(bytes) === packet.sha256,
        `The bytes of packet ${packetId} do not have the reported SHA-256.`,
      )
      record.packet(packet)
      return { packet, bytes }
    }
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error(`Packet ${packetId} was not made within a minute.`)
}

export async function makePacket({ api, job, designId, record }) {
  const queued = await api.act(`/jobs/${job.id}/packets`, { designId })
  const { packet, bytes } = await waitForPacket({ api, packetId: queued.id, record })
  record.step(
    'planner',
    `makes packet A of revision ${packet.revision}`,
    `${packet.pages.length} pages, ${packet.sha256.slice(0, 12)}`,
  )
  return { packet, bytes }
}

export async function sendToLandowner({ api, job, record }) {
  const sent = await api.act(`/jobs/${job.id}/acts`, { action: 'send-to-landowner' })
  record.step('planner', 'sends it to the landowner', sent.waitsFor)
  record.state(sent, 'with-landowner')
}

export async function answerNotes({ api, job, text, record }) {
  const notes = await api.get(`/jobs/${job.id}/notes`)
  const open = notes.filter(({ status }) => status === 'open')
  promise(open.length > 0, 'There should be an open note to answer.')
  for (const { id } of open) {
    await api.post(`/notes/${id}/answer`, { text })
    await api.post(`/notes/${id}/settle`)
  }
  record.step('planner', 'answers and settles the notes', `${open.length}`)
}
