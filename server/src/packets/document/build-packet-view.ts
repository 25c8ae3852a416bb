import {
  civilDateText,
  crossSectionsSheet,
  detailsSheet,
  levelNames,
  numberText,
  planSheet,
  profileSheet,
  sheetModel,
  type Sheet,
  type SheetModel,
  type SheetTitle,
} from 'shared'
import type { PageDraft } from './layout/block.js'
import { paginate, type LaidPage } from './layout/paginate.js'
import { sheetPageOf, textPageOf } from './make-page.js'
import { packetDocumentVersion, type PacketDocument, type PageFrame } from './packet-document.js'
import type { PacketSource } from './packet-source.js'
import { checksPage } from './pages/checks-page.js'
import { costPage } from './pages/cost-page.js'
import { coverPage } from './pages/cover-page.js'
import { groundPage } from './pages/ground-page.js'
import { quantitiesPage } from './pages/quantities-page.js'
import { signaturesPage } from './pages/signatures-page.js'
import { sitePage } from './pages/site-page.js'
import { cautionsPage, constructionPage, maintenancePage } from './pages/text-pages.js'
import { workingPage } from './pages/working-page.js'

type SheetMaker = (model: SheetModel, title: SheetTitle) => Sheet

const sheetMakers: readonly { title: string; make: SheetMaker }[] = [
  { title: 'Plan', make: planSheet },
  { title: 'Profile', make: profileSheet },
  { title: 'Sections across the ramp', make: crossSectionsSheet },
  { title: 'Details', make: detailsSheet },
]

/** A page before its number is known. */
type Slot = { kind: 'text'; laid: LaidPage } | { kind: 'sheet'; title: string; make: SheetMaker }

/** Packet A: everything that is read and signed, page by page, from what was frozen. */
export function buildPacketView(source: PacketSource): PacketDocument {
  const { plan, result, survey, job } = source
  const model = sheetModel({ plan, result, groundLine: survey.groundLine })
  if (!model) throw new Error('A packet needs a design whose ramp is worked out')
  const frame = frameOf(source)
  const body = bodySlots(source)
  // The cover lists the pages, and its own length does not depend on their numbers.
  const coverLength = paginate(coverPage(source, contentsOf(body, 2))).length
  const cover = textSlots(coverPage(source, contentsOf(body, coverLength + 1)))
  const slots = [...cover, ...body]
  const pages = slots.map((slot, index) => {
    const label = `Page ${index + 1} of ${slots.length}`
    if (slot.kind === 'text') return textPageOf(slot.laid, frame, label)
    const title = sheetTitle(source, { number: index + 1, count: slots.length })
    return sheetPageOf(slot.make(model, title), frame, label)
  })
  return {
    version: packetDocumentVersion,
    kind: 'A',
    title: `${job.number} ${job.title}, revision ${source.revision}`,
    subject: 'Livestock watering ramp: drawings, quantities, cost, checks and agreement',
    author: source.district.name,
    language: 'en-US',
    madeAt: source.madeAt,
    frame,
    pages,
  }
}

const textSlots = (draft: PageDraft): Slot[] => paginate(draft).map((laid) => ({ kind: 'text', laid }))

function bodySlots(source: PacketSource): Slot[] {
  const { body } = source.job
  const after = [
    quantitiesPage(source),
    costPage(source),
    checksPage(source),
    constructionPage(body),
    maintenancePage(body),
    cautionsPage(body),
    signaturesPage(source),
    groundPage(source),
    ...(source.result.working.length > 0 ? [workingPage(source)] : []),
  ]
  const sheets = sheetMakers.map(({ title, make }): Slot => ({ kind: 'sheet', title, make }))
  return [...textSlots(sitePage(source)), ...sheets, ...after.flatMap(textSlots)]
}

function contentsOf(slots: readonly Slot[], firstNumber: number): { number: number; title: string }[] {
  return slots.flatMap((slot, index) => {
    const title = slot.kind === 'text' ? slot.laid.title : slot.title
    return title.endsWith(', continued') ? [] : [{ number: index + firstNumber, title }]
  })
}

const frameOf = ({ district, job, revision }: PacketSource): PageFrame => ({
  district: district.name,
  timeZone: district.timeZone,
  jobTitle: job.title,
  jobNumber: job.number,
  revision,
  isExample: district.isDemo,
})

function sheetTitle(source: PacketSource, sheet: { number: number; count: number }): SheetTitle {
  const { district, job, plan } = source
  const fullPool = plan.site?.fullPoolElevationFt
  return {
    district: district.name,
    jobTitle: job.title,
    jobNumber: job.number,
    revision: source.revision,
    sheetNumber: sheet.number,
    sheetCount: sheet.count,
    designedBy: source.designerName,
    designedOn: civilDateText(source.madeAt),
    checkedBy: 'see the evidence page',
    levels:
      fullPool === undefined
        ? 'local'
        : `${levelNames[job.body].high} = ${numberText(fullPool, 2)} ft, local`,
    isExample: district.isDemo,
  }
}
