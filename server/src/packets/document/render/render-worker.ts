import type { PacketDocument } from '../packet-document.js'
import { renderPacket } from './render-packet.js'

/** The thread's one task. The bytes are handed over, not copied. */
export default function render(packet: PacketDocument): Promise<Uint8Array> {
  return renderPacket(packet)
}
