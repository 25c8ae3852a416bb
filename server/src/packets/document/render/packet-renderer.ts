import { Piscina } from 'piscina'
import type { PacketDocument } from '../packet-document.js'

/** Renders packets beside the server's own thread, so that nobody waits for a drawing of somebody else. */
export class PacketRenderer {
  private readonly pool: Piscina<PacketDocument, Uint8Array>

  constructor({ threads = 2 }: { threads?: 1 | 2 } = {}) {
    const filename = new URL('./render-worker.js', import.meta.url).href
    this.pool = new Piscina({ filename, minThreads: 0, maxThreads: threads, idleTimeout: 30_000 })
  }

  render(packet: PacketDocument): Promise<Uint8Array> {
    return this.pool.run(packet)
  }

  close(): Promise<void> {
    return this.pool.destroy()
  }
}
