import type { JobInLetter, Letter } from './letter.js'

export interface PacketFacts extends JobInLetter {
  readonly recipientName: string
  readonly fileName: string
  readonly sha256: string
}

/** The approved packet on its way to the landowner. */
export function packetLetter(facts: PacketFacts): Letter {
  return {
    subject: `Approved packet of your watering ramp, job ${facts.number}`,
    paragraphs: [
      `Dear ${facts.recipientName},`,
      `Your plan "${facts.title}" is approved. The whole packet is attached as ${facts.fileName}. Keep it: it shows what to build, what it should cost and what the funds pay.`,
      'Before anyone digs, have the underground lines marked by the utility-locating service, and ask whether permits are needed.',
      `Fingerprint of the file (SHA-256):\n${facts.sha256}`,
    ],
  }
}
