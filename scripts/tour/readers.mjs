import { promise } from './record.mjs'

/** The technical check, by a person who did not design it. */
export async function checkPacket({ api, packet, record }) {
  const checked = await api.act(`/packets/${packet.id}/technical-check`, {
    note: 'Figures and sources agree.',
  })
  promise(
    checked.technicalCheck?.withinLimits === true,
    'The design is beyond the limits of the person who checked it.',
  )
  record.step('checker', `checks revision ${checked.revision}`, 'within limits')
}

/** The landowner comes by the mailed link and the mailed code, with no password. */
export async function comeByMail({ api, mailbox, record }) {
  const { mail } = await mailbox.next('a link to the packet', ({ text }) => /#t=/.test(text ?? ''))
  const token = /#t=([A-Za-z0-9_-]{43})/.exec(mail.text)?.[1]
  promise(token !== undefined, 'The mail to the landowner holds no link.')
  await api.post('/entry/open', { token })
  const { mail: codeMail } = await mailbox.next('a code', ({ text }) => /\b\d{6}\b/.test(text ?? ''))
  const code = /\b(\d{6})\b/.exec(codeMail.text)?.[1]
  const session = await api.post('/entry/code', { token, code })
  record.step('landowner', 'opens the mailed link and types the mailed code', session.name)
  return session
}

async function readAll({ api, packet }) {
  for (const { number } of packet.pages) await api.post(`/packets/${packet.id}/read-pages`, { page: number })
}

export async function askForChange({ api, job, packet, asks, record }) {
  const [first] = packet.pages
  await api.post(`/packets/${packet.id}/read-pages`, { page: first.number })
  const page = asks.page === undefined ? {} : { page: asks.page }
  const returned = await api.act(`/jobs/${job.id}/acts`, {
    action: 'ask-for-changes',
    note: asks.note,
    ...page,
  })
  record.step('landowner', 'asks for a change', asks.note)
  record.state(returned, 'returned')
}

export async function sign({ api, job, packet, name, record }) {
  const seen = await api.get(`/packets/${packet.id}`)
  if (!seen.iHaveConsented) {
    await api.post(`/packets/${packet.id}/consent`, { consentVersion: '2026-1', agrees: true })
  }
  await readAll({ api, packet })
  const body = { action: 'sign', typedName: name, intends: true, packetSha256: packet.sha256 }
  const signed = await api.act(`/jobs/${job.id}/acts`, body)
  record.step('landowner', `reads ${packet.pages.length} pages and signs revision ${packet.revision}`, name)
  record.state(signed, 'with-supervisor')
}

export async function returnWithNote({ api, job, asks, record }) {
  const returned = await api.act(`/jobs/${job.id}/acts`, { action: 'return', notes: [asks.note] })
  record.step('supervisor', 'returns it with a note', asks.note)
  record.state(returned, 'returned')
}

export async function approve({ api, job, packet, record }) {
  const approved = await api.act(`/jobs/${job.id}/acts`, { action: 'approve', packetSha256: packet.sha256 })
  record.step('supervisor', `approves revision ${packet.revision}`, packet.sha256.slice(0, 12))
  record.state(approved, 'approved')
  return approved
}
