import { moneyText, numberText, readyValue } from 'shared'
import { buildPacketView } from './build-packet-view.js'
import { renderPacket } from './render/render-packet.js'
import { northPondSource } from '../../../test/packets/north-pond-source.js'
import { pageTexts, pdfFonts, pdfInfo, qpdfCheck } from '../../../test/packets/pdf-tools.js'

const source = northPondSource()
const view = buildPacketView(source)
const { result, plan } = source

let bytes: Uint8Array
let texts: string[]
beforeAll(async () => {
  bytes = await renderPacket(view)
  texts = pageTexts(bytes)
})

/** All pages of one title, one after the other. */
const pageOf = (title: string): string =>
  texts.filter((_, index) => view.pages[index]?.title.startsWith(title)).join('\n')
const flat = (text: string) => text.replace(/\s+/g, ' ')

describe('packet A as a file', () => {
  it('has nine pages or more, each of which the view knows', () => {
    expect(texts.length).toBeGreaterThanOrEqual(9)
    expect(texts).toHaveLength(view.pages.length)
  })

  it('is sound for qpdf, which repairs nothing', () => {
    expect(qpdfCheck(bytes)).toContain('No syntax or stream encoding errors found')
  })

  it('is tagged, titled, in English, and written with the settings of PDF/A-2a', () => {
    const info = pdfInfo(bytes)
    expect(info).toMatch(/Tagged:\s+yes/)
    expect(info).toMatch(/Title:\s+26-014 Marchbank, north pond, revision 1/)
    const structure = pdfInfo(bytes, '-struct')
    expect(structure).toMatch(/H1/)
    expect(structure).toMatch(/TH/)
    expect(structure).toMatch(/Figure/)
    expect(Buffer.from(bytes).toString('latin1')).toContain('/Lang (en-US)')
  })

  it('embeds every font it uses', () => {
    const rows = pdfFonts(bytes).trim().split('\n').slice(2)
    expect(rows.length).toBeGreaterThan(0)
    rows.forEach((row) => expect(row).toMatch(/SourceSans3\S*\s+CID TrueType\s+Identity-H\s+yes yes yes/))
  })

  it('is the same, byte for byte, when it is made again from the same source', async () => {
    const again = await renderPacket(buildPacketView(northPondSource()))
    expect(Buffer.from(again).equals(Buffer.from(bytes))).toBe(true)
  })

  it('survives being stored as JSON', async () => {
    const stored = JSON.parse(JSON.stringify(view)) as typeof view
    expect(Buffer.from(await renderPacket(stored)).equals(Buffer.from(bytes))).toBe(true)
  })

  it('numbers its pages and marks every one of them as an example', () => {
    texts.forEach((text, index) => {
      expect(text).toContain(`Page ${index + 1} of ${texts.length}`)
      expect(text).toContain('Example data: people, places, prices and funds are invented.')
    })
  })

  it('keeps the signs that poor fonts turn to boxes', () => {
    const all = texts.join('\n')
    const signs = ['≥', '²', '³', '×', '′', '″', '–', '·', '√']
    signs.forEach((sign) => expect(all).toContain(sign))
    expect(all).not.toMatch(/[\uFFFD\u25A1]/)
  })
})

describe('packet A as a reading', () => {
  it('says the deciding figures on the cover', () => {
    const cover = flat(texts[0] ?? '')
    const slope = readyValue(result.profile)?.slopeLengthFt ?? 0
    expect(cover).toMatch(/8\s?:\s?1/)
    expect(cover).toContain('18′-0″')
    expect(cover).toContain(`${numberText(slope, 1)} ft`)
    expect(cover).toContain(moneyText(readyValue(result.cost)?.typical ?? ''))
    expect(cover).toContain(moneyText(readyValue(result.funding)?.landownerShare ?? ''))
  })

  it('writes grade, run, slope length and levels on the profile', () => {
    const profile = flat(pageOf('Profile'))
    ;['Ramp 56′-0″ level, 56′-5″ on the slope', 'Full pool 100.00', '0+43.6', '101.50'].forEach((figure) =>
      expect(profile).toContain(figure),
    )
    expect(profile).toMatch(/8\s?:\s?1 \(12\.5\s?%\)/)
    expect(profile).toMatch(/Vertical exaggeration [\d.]+×/)
  })

  it('gives stone by layer, fabric, fence and berm on the quantities', () => {
    const quantities = flat(pageOf('Quantities'))
    readyValue(result.rock)?.layers.forEach((layer) => {
      expect(quantities).toContain(numberText(layer.tons, 2))
      expect(quantities).toContain(numberText(layer.orderTons, 2))
    })
    const fabric = readyValue(result.fabric)
    const fence = readyValue(result.fence)
    expect(quantities).toContain(`${numberText(fabric?.[fabric.recommended].grossAreaFt2 ?? 0, 1)} ft²`)
    fence?.runs.forEach((run) => expect(quantities).toContain(numberText(run.lengthFt, 1)))
    expect(quantities).toContain(`${numberText(readyValue(result.berm)?.lengthFt ?? 0, 1)} ft`)
  })

  it('gives each line of cost, the total, what each fund pays and why not more, and the landowner’s share', () => {
    const money = flat(pageOf('Cost and who pays'))
    const cost = readyValue(result.cost)
    const funding = readyValue(result.funding)
    cost?.lines.forEach((line) => expect(money).toContain(moneyText(line.typical)))
    expect(money).toContain(`Total ${moneyText(cost?.typical ?? '')}`)
    funding?.sources.forEach((fund) => {
      expect(money).toContain(fund.name)
      expect(money).toContain(moneyText(fund.paid))
      fund.cuts.forEach((cut) => expect(money).toContain(cut.reason))
    })
    expect(money).toContain('of the cost left after the funds before it')
    expect(money).toContain(`Landowner’s share ${moneyText(funding?.landownerShare ?? '')}`)
  })

  it('gives every check with limit, verdict and source', () => {
    const checks = flat(pageOf('Checks'))
    expect(result.checks.length).toBeGreaterThan(0)
    result.checks.forEach(({ title }) => expect(checks).toContain(title))
    expect(checks).toContain('≥ 6 run per rise')
    expect(checks).toContain('✓ holds')
    expect(checks).toContain('Kansas State University')
  })

  it('never says that a job is free of a permit, and always says to call before digging', () => {
    const all = flat(texts.join(' '))
    expect(all).not.toMatch(/exempt/i)
    expect(flat(pageOf('Cautions'))).toContain('call the utility-locating service before digging')
    ;['Plan', 'Profile', 'Sections', 'Details'].forEach((sheet) =>
      expect(flat(pageOf(sheet))).toContain('Call the utility-locating service. Await written approval.'),
    )
  })

  it('leaves the signature lines empty and carries no hash of itself', () => {
    expect(flat(pageOf('Signatures'))).toContain('Landowner Odile Marchbank Date')
    expect(texts.join('\n')).not.toMatch(/[0-9a-f]{64}/)
  })

  it('gives each page as plain lines too, without a figure that is no number', () => {
    view.pages.forEach(({ text }) => {
      expect(text.length).toBeGreaterThan(0)
      expect(text.join('\n')).not.toMatch(/NaN|undefined|\[object/)
    })
    const grade = view.pages.find(({ title }) => title === 'Profile')?.text.join(' ')
    expect(grade).toContain(`falls at ${plan.ramp?.gradeRunPerRise}`)
  })
})

describe('a packet of a district that is no example', () => {
  it('carries no word of example data of its own', async () => {
    const real = northPondSource({ district: { ...source.district, isDemo: false } })
    const all = pageTexts(await renderPacket(buildPacketView(real))).join('\n')
    expect(all).not.toContain('Example data:')
    expect(all).not.toContain('· example data')
  })
})
