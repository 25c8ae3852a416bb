import { Injectable, type OnModuleDestroy } from '@nestjs/common'
import type { PacketDocument } from './document/packet-document.js'
import { PacketRenderer } from './document/render/packet-renderer.js'

/** The threads that draw packets, for as long as the server runs. */
@Injectable()
export class PacketRendererService implements OnModuleDestroy {
  private readonly renderer = new PacketRenderer()

  render(document: PacketDocument): Promise<Uint8Array> {
    return this.renderer.render(document)
  }

  onModuleDestroy(): Promise<void> {
    return this.renderer.close()
  }
}
