import {
  northPond,
  northPondDesign,
  northPondNotes,
  northPondRows,
} from '../../../shared/examples/north-pond-design.js'
import type { PacketEvidence, PacketSource } from '../../src/packets/document/packet-source.js'

/** The north pond as a packet needs it: invented people and places, figures worked out by the design itself. */
export function northPondSource(change: Partial<PacketSource> = {}): PacketSource {
  const { plan, result, groundLine } = northPondDesign()
  const { producer, job, costList, schedules, settings, survey } = northPond
  const address = producer.address
  return {
    district: {
      name: 'Sable Basin Conservation District',
      addressLines: ['40 Mill Street', 'Farrow, Norland 00117'],
      timeZone: 'America/Chicago',
      isDemo: true,
    },
    job: { number: '26-014', ...job },
    producers: [
      {
        name: producer.name,
        farmName: producer.farmName,
        addressLines: address
          ? [address.street, `${address.town}, ${address.region} ${address.postalCode}`]
          : [],
      },
    ],
    designerName: 'Ines Varga',
    revision: 1,
    madeAt: '2026-05-14T20:04:00.000Z',
    survey: {
      survey: { kind: 'level-notes', startElevationFt: survey.startElevationFt, rows: northPondRows },
      groundLine,
      reduction: northPondNotes,
    },
    plan,
    result,
    criteriaSet: { name: 'Ramp criteria 2026 (example)', effectiveFrom: '2026-01-01' },
    costList: { name: costList.name, effectiveFrom: costList.effectiveFrom, source: costList.source },
    schedules,
    settings,
    variances: [],
    ...change,
  }
}

export const northPondEvidence: PacketEvidence = {
  packetASha256: '7c1e09ab'.repeat(8),
  signatures: [
    {
      name: 'Odile Marchbank',
      typedName: 'Odile J. Marchbank',
      signedAt: '2026-05-18T13:22:10.000Z',
      method: 'mailed-link-and-code',
      consentVersion: '2026-1',
      ip: '203.0.113.9',
      userAgent: 'Mozilla/5.0 (X11; Linux x86_64)',
    },
  ],
  technicalCheck: { by: 'Ravi Sund', at: '2026-05-16T15:00:00.000Z', withinLimits: true, note: null },
  approval: {
    name: 'Tomas Quill',
    at: '2026-05-20T18:00:00.000Z',
    meetingDate: '2026-05-20',
    agendaItem: '7',
  },
  eventChain: { sequence: 41, rowHash: 'ab12'.repeat(16) },
}
