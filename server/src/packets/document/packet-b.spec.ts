import { buildPacketView } from './build-packet-view.js'
import { renderPacket } from './render/render-packet.js'
import { northPondEvidence, northPondSource } from '../../../test/packets/north-pond-source.js'
import { pagePictures, pageTexts, qpdfCheck } from '../../../test/packets/pdf-tools.js'
import { withEvidence } from './with-evidence.js'

const packetA = buildPacketView(northPondSource())
const packetB = withEvidence(packetA, northPondEvidence)
const common = packetA.pages.length

let fileA: Uint8Array
let fileB: Uint8Array
beforeAll(async () => {
  fileA = await renderPacket(packetA)
  fileB = await renderPacket(packetB)
})

describe('packet B', () => {
  it('repeats every page of packet A word for word', () => {
    expect(pageTexts(fileB).slice(0, common)).toEqual(pageTexts(fileA))
  })

  it('repeats every page of packet A as a picture', () => {
    expect(pagePictures(fileB, common)).toEqual(pagePictures(fileA, common))
  })

  it('adds what was signed, by whom, when in both clocks and how, the approval and the head of the record', () => {
    const evidence = pageTexts(fileB).slice(common).join(' ').replace(/\s+/g, ' ')
    const expected = [
      northPondEvidence.packetASha256,
      'Odile J. Marchbank',
      '18 May 2026, 08:22 CDT',
      '2026-05-18T13:22:10.000Z (UTC)',
      'by a mailed link and a mailed code',
      'version 2026-1',
      '203.0.113.9',
      'Ravi Sund',
      'Tomas Quill',
      'Agenda item 7',
      'number 41',
      northPondEvidence.eventChain.rowHash,
    ]
    expected.forEach((words) => expect(evidence).toContain(words))
  })

  it('is sound for qpdf and the same when made again', async () => {
    expect(qpdfCheck(fileB)).toContain('No syntax or stream encoding errors found')
    const again = await renderPacket(withEvidence(packetA, northPondEvidence))
    expect(Buffer.from(again).equals(Buffer.from(fileB))).toBe(true)
  })

  it('says that no technical check is on record where there was none', () => {
    const bare = withEvidence(packetA, { ...northPondEvidence, technicalCheck: null })
    expect(bare.pages.at(-1)?.text.join(' ')).toContain('no technical check is on record')
  })
})
