import type { ActScene } from './act-context.js'

export interface PacketOfAct {
  packetId: string
  sha256: string
}

/** The packet an act is about. The guards have seen that it is there and made; without it nothing may be recorded. */
export function packetAOf({ facts, job }: ActScene): PacketOfAct {
  return made(facts.packetA, `packet A of job ${job.id}`)
}

export function packetBOf({ facts, job }: ActScene): PacketOfAct {
  return made(facts.packetB, `packet B of job ${job.id}`)
}

function made(packet: { id: string; sha256: string | null } | null, what: string): PacketOfAct {
  if (packet === null || packet.sha256 === null)
    throw new Error(`An act went past its guards without ${what}.`)
  return { packetId: packet.id, sha256: packet.sha256 }
}
