import { describe, expect, it } from 'vitest'
import { actionsFor } from './actions-for.js'
import { decide } from './decide.js'
import { edges, jobActions, type Edge, type JobAction } from './edges.js'
import { guards, type GuardName } from './guards.js'
import type { ActRequest, JobFacts } from './job-facts.js'
import type { Actor } from './roles.js'
import { endStates, jobStates, type JobState } from './states.js'

const designer = 'designer'
const landowner = 'landowner'
const hash = 'a'.repeat(64)

/** A job for which every guard of every edge holds. */
const openFacts: JobFacts = {
  jobId: 'job',
  districtId: 'district',
  state: 'draft',
  designerId: designer,
  payeeAndKinIds: [landowner],
  packetA: { id: 'packet', sha256: hash },
  technicalCheck: { checkerId: 'checker', withinLimits: true },
  failingChecksWithoutVariance: 0,
  openNotes: 0,
  landownerAddressKnown: true,
  requiredSignerIds: [landowner],
  signedByIds: [],
  consentedIds: [landowner],
  hasReadIds: [landowner],
  budgetLeft: true,
  packetB: { id: 'final', sha256: hash },
  permitsRecorded: true,
  utilityTicketRecorded: true,
  everyQuantityMeasured: true,
  ticketsMatch: true,
  measurerId: 'measurer',
  certifierIds: ['other'],
  changeOrderOpen: false,
  finalPaymentWithinPayable: true,
  inspectionDatesSet: true,
  checkerMayApprove: false,
}

const fullRequest: ActRequest = {
  packetSha256: hash,
  note: 'Move the gate.',
  notes: 1,
  reason: 'The pond was sold.',
  addressConfirmed: true,
}

const signedBefore: readonly JobAction[] = ['approve', 'take-signature-back']

function happyCase(edge: Edge, state: JobState): { facts: JobFacts; actor: Actor } {
  const role = edge.roles[0]
  if (role === undefined) throw new Error(`The edge ${edge.action} names no role`)
  const personId = role === 'landowner' ? landowner : 'other'
  const signedByIds = signedBefore.includes(edge.action) ? [landowner] : []
  return {
    facts: { ...openFacts, state, signedByIds },
    actor: { personId, districtId: 'district', roles: [role] },
  }
}

describe('every listed edge', () => {
  for (const edge of edges) {
    for (const state of edge.from) {
      it(`lets a ${edge.roles[0]} ${edge.action} from ${state} to ${edge.to}`, () => {
        const { facts, actor } = happyCase(edge, state)
        expect(decide(facts, edge.action, actor, fullRequest)).toEqual({ allowed: true, to: edge.to })
      })
      it(`refuses ${edge.action} from ${state} to a person without the role`, () => {
        const { facts, actor } = happyCase(edge, state)
        const decision = decide(facts, edge.action, { ...actor, roles: ['administrator'] }, fullRequest)
        expect(decision).toMatchObject({ allowed: false, problem: 'forbidden' })
      })
      it(`refuses ${edge.action} from ${state} to a person of another district`, () => {
        const { facts, actor } = happyCase(edge, state)
        const decision = decide(facts, edge.action, { ...actor, districtId: 'elsewhere' }, fullRequest)
        expect(decision).toMatchObject({ allowed: false, problem: 'forbidden' })
      })
    }
  }
})

describe('every unlisted pair of state and act', () => {
  for (const state of jobStates) {
    for (const action of jobActions) {
      if (edges.some((edge) => edge.action === action && edge.from.includes(state))) continue
      it(`refuses ${action} from ${state}`, () => {
        const anyone: Actor = {
          personId: 'other',
          districtId: 'district',
          roles: ['planner', 'landowner', 'supervisor', 'office', 'administrator'],
        }
        expect(decide({ ...openFacts, state }, action, anyone, fullRequest)).toMatchObject({
          allowed: false,
          problem: 'transition-not-allowed',
        })
      })
    }
  }
})

/** For each guard the smallest change of facts, person or request that breaks it. */
const broken: Record<
  GuardName,
  { facts?: Partial<JobFacts>; actorId?: string; request?: Partial<ActRequest> }
> = {
  packetRendered: { facts: { packetA: { id: 'packet', sha256: null } } },
  technicallyChecked: { facts: { technicalCheck: null } },
  checkerDidNotDesign: { facts: { technicalCheck: { checkerId: designer, withinLimits: true } } },
  checkerWithinLimits: { facts: { technicalCheck: { checkerId: 'checker', withinLimits: false } } },
  noFailingCheck: { facts: { failingChecksWithoutVariance: 1 } },
  noOpenNote: { facts: { openNotes: 1 } },
  landownerReachable: { facts: { landownerAddressKnown: false } },
  isSigner: { facts: { requiredSignerIds: ['somebody'] } },
  signerIsNoJudge: { facts: { technicalCheck: { checkerId: landowner, withinLimits: true } } },
  notSignedYet: { facts: { signedByIds: [landowner] } },
  hasSigned: { facts: { signedByIds: [] } },
  hasConsented: { facts: { consentedIds: [] } },
  hasRead: { facts: { hasReadIds: [] } },
  hashMatches: { request: { packetSha256: 'b'.repeat(64) } },
  hasNote: { request: { note: '  ' } },
  hasNotes: { request: { notes: 0 } },
  hasReason: { request: { reason: '' } },
  notDesigner: { actorId: designer },
  notPayeeOrKin: { facts: { payeeAndKinIds: ['other'] } },
  checkerMayDecide: { facts: { technicalCheck: { checkerId: 'other', withinLimits: true } } },
  signaturesStand: { facts: { signedByIds: [] } },
  budgetLeft: { facts: { budgetLeft: false } },
  finalPacketReady: { facts: { packetB: { id: 'final', sha256: null } } },
  addressConfirmed: { request: { addressConfirmed: false } },
  permitsRecorded: { facts: { permitsRecorded: false } },
  utilityTicketRecorded: { facts: { utilityTicketRecorded: false } },
  allMeasured: { facts: { everyQuantityMeasured: false } },
  ticketsMatch: { facts: { ticketsMatch: false } },
  notMeasurer: { facts: { measurerId: 'other' } },
  mayCertify: { facts: { certifierIds: [] } },
  noChangeOrderOpen: { facts: { changeOrderOpen: true } },
  withinPayable: { facts: { finalPaymentWithinPayable: false } },
  inspectionDatesSet: { facts: { inspectionDatesSet: false } },
}

describe('every guard of every edge', () => {
  for (const edge of edges) {
    for (const name of edge.guards) {
      it(`stops ${edge.action} when ${name} does not hold, and says so`, () => {
        const state = edge.from[0] ?? 'draft'
        const { facts, actor } = happyCase(edge, state)
        const change = broken[name]
        const brokenFacts = { ...facts, ...change.facts }
        const brokenActor = { ...actor, personId: change.actorId ?? actor.personId }
        const request = { ...fullRequest, ...change.request }
        const sentence = guards[name](brokenFacts, brokenActor, request)
        expect(sentence).toMatch(/\.$/)
        const decision = decide(brokenFacts, edge.action, brokenActor, request)
        expect(decision).toMatchObject({ allowed: false, problem: 'transition-not-allowed' })
        expect(decision).toHaveProperty('reasons', expect.arrayContaining([sentence]))
      })
    }
  }

  it('is used by at least one edge', () => {
    const used = new Set(edges.flatMap((edge) => edge.guards))
    expect([...used].sort()).toEqual(Object.keys(guards).sort())
  })
})

describe('signing', () => {
  it('leaves the job with the landowner while another signer has not signed', () => {
    const facts: JobFacts = {
      ...openFacts,
      state: 'with-landowner',
      requiredSignerIds: [landowner, 'partner'],
    }
    const actor: Actor = { personId: landowner, districtId: 'district', roles: ['landowner'] }
    expect(decide(facts, 'sign', actor, fullRequest)).toEqual({ allowed: true, to: 'with-landowner' })
    const last: JobFacts = { ...facts, signedByIds: ['partner'] }
    expect(decide(last, 'sign', actor, fullRequest)).toEqual({ allowed: true, to: 'with-supervisor' })
  })
})

describe('a design that several people saved', () => {
  const facts: JobFacts = { ...openFacts, designerIds: [designer, 'second'] }

  it('may be checked by none of them', () => {
    const checked: JobFacts = { ...facts, technicalCheck: { checkerId: 'second', withinLimits: true } }
    const planner: Actor = { personId: 'planner', districtId: 'district', roles: ['planner'] }
    expect(decide(checked, 'send-to-landowner', planner, fullRequest)).toMatchObject({
      allowed: false,
      reasons: [expect.stringContaining('made by the designer')],
    })
  })

  it('may be approved by none of them', () => {
    const signed: JobFacts = { ...facts, state: 'with-supervisor', signedByIds: [landowner] }
    const supervisor: Actor = { personId: 'second', districtId: 'district', roles: ['supervisor'] }
    expect(decide(signed, 'approve', supervisor, fullRequest)).toMatchObject({ allowed: false })
    expect(decide(signed, 'approve', { ...supervisor, personId: 'third' }, fullRequest)).toMatchObject({
      allowed: true,
    })
  })
})

describe('the graph of states', () => {
  it('reaches every state from draft', () => {
    const reached = new Set<JobState>(['draft'])
    for (let step = 0; step < jobStates.length; step += 1) {
      for (const edge of edges) if (edge.from.some((state) => reached.has(state))) reached.add(edge.to)
    }
    expect([...reached].sort()).toEqual([...jobStates].sort())
  })

  it('has no dead state but the end states', () => {
    const dead = jobStates.filter((state) => !edges.some((edge) => edge.from.includes(state)))
    expect([...dead].sort()).toEqual([...endStates].sort())
  })
})

describe('the buttons of a job', () => {
  it('offers only acts of the roles held, disabled ones with their reasons', () => {
    const facts: JobFacts = { ...openFacts, openNotes: 2, technicalCheck: null }
    const planner: Actor = { personId: 'planner', districtId: 'district', roles: ['planner'] }
    const offered = actionsFor(facts, planner)
    expect(offered.map(({ action, enabled }) => [action, enabled])).toEqual([
      ['send-to-landowner', false],
      ['withdraw', true],
    ])
    expect(offered[0]?.reasons).toHaveLength(2)
  })
})
