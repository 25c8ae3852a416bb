import { buildPacketView } from '../build-packet-view.js'
import { northPondSource } from '../../../../test/packets/north-pond-source.js'
import { PacketRenderer } from './packet-renderer.js'
import { renderPacket } from './render-packet.js'

describe('PacketRenderer', () => {
  it('gives the very bytes that rendering in place gives', async () => {
    const view = buildPacketView(northPondSource())
    const renderer = new PacketRenderer({ threads: 1 })
    const bytes = await renderer.render(view)
    await renderer.close()
    expect(Buffer.from(bytes).equals(Buffer.from(await renderPacket(view)))).toBe(true)
  })
})
