import { randomUUID } from 'node:crypto'
import { promise, sha256 } from './record.mjs'
import { waitForPacket } from './planner.mjs'

async function finalPacketId({ api, job }) {
  for (let tries = 0; tries < 600; tries += 1) {
    const { finalPacketId: id } = await api.get(`/jobs/${job.id}`)
    if (id !== null) return id
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error('Packet B was not begun within a minute.')
}

/** Sends packet B, presses the button twice with one key, and holds the mailed bytes against the stored hash. */
export async function sendPacket({ api, job, mailbox, record }) {
  const packetId = await finalPacketId({ api, job })
  const { packet, bytes } = await waitForPacket({ api, packetId, record })
  record.step('office', 'finds packet B made', `${packet.pages.length} pages, ${packet.sha256.slice(0, 12)}`)

  const key = randomUUID()
  const press = () => api.act(`/jobs/${job.id}/acts`, { action: 'send', addressConfirmed: true }, key)
  const sent = await press()
  const again = await press()
  record.step('office', 'sends it, and presses twice', again.number)
  record.state(sent, 'sent')
  promise(again.version === sent.version, 'The second press changed the job.')

  const { mail, bytes: message } = await mailbox.next(
    'the packet',
    ({ attachments }) => attachments.length > 0,
  )
  const hash = sha256(mail.attachments[0].content)
  promise(
    hash === packet.sha256,
    `The mailed packet has SHA-256 ${hash}, the server reports ${packet.sha256}.`,
  )
  record.step('landowner', 'gets the packet by mail', `${mail.attachments[0].filename}, ${hash.slice(0, 12)}`)
  record.file('packet.pdf', bytes)
  record.file('mail.eml', message)

  const log = await api.get(`/jobs/${job.id}/mail`)
  const packetMails = log.filter(({ attachment }) => attachment !== null)
  promise(
    packetMails.length === 1,
    `The office sent ${packetMails.length} messages with the packet, not one.`,
  )
  return packet
}
