import { existsSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { Piscina } from 'piscina'
import type { PacketDocument } from '../packet-document.js'
import { renderPacket } from './render-packet.js'

/** Renders packets beside the server's own thread, so that nobody waits for a drawing of somebody else. */
export class PacketRenderer {
  private readonly pool: Piscina<PacketDocument, Uint8Array> | null

  constructor({ threads = 2 }: { threads?: 1 | 2 } = {}) {
    const worker = new URL('./render-worker.js', import.meta.url)
    // Tests run the sources themselves, where no built worker stands beside this file: they render on their own thread.
    const isBuilt = existsSync(fileURLToPath(worker))
    this.pool = isBuilt
      ? new Piscina({ filename: worker.href, minThreads: 0, maxThreads: threads, idleTimeout: 30_000 })
      : null
  }

  render(packet: PacketDocument): Promise<Uint8Array> {
    return this.pool ? this.pool.run(packet) : renderPacket(packet)
  }

  async close(): Promise<void> {
    await this.pool?.destroy()
  }
}
