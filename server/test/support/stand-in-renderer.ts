import { PacketRendererService } from '../../src/packets/packet-renderer.service'
import type { TestApp } from './test-app'

/** For tests in which a packet must be made, and how it looks is not the matter: other bytes for every other content. */
export function drawStandIns({ nest }: TestApp): void {
  jest
    .spyOn(nest.get(PacketRendererService, { strict: false }), 'render')
    .mockImplementation((document) => Promise.resolve(Buffer.from(`%PDF-1.7 ${JSON.stringify(document)}`)))
}
