import type { PacketView } from 'shared'

export interface PacketMoney {
  whole: string
  funds: string
  share: string
}

/** The sentence of the signature page that the signer agrees to; the packet is frozen, so its words are too. */
const SENTENCE =
  /Estimated cost (?<whole>\$[\d,]+\.\d{2})\. All funds together (?<funds>\$[\d,]+\.\d{2})\. Left to the landowner (?<share>\$[\d,]+\.\d{2})\./

/** What the packet says that the job costs and who pays it, or null when it says nothing of money. */
export function packetMoney({ pages }: Pick<PacketView, 'pages'>): PacketMoney | null {
  const found = SENTENCE.exec(pages.flatMap(({ text }) => text).join(' '))?.groups
  if (found === undefined) return null
  const { whole = '', funds = '', share = '' } = found
  return { whole, funds, share }
}
