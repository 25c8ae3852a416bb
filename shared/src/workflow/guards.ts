import type { ActRequest, JobFacts } from './job-facts.js'
import type { Actor } from './roles.js'

/** A guard returns the sentence that says what still blocks the act, or null. */
export type Guard = (facts: JobFacts, actor: Actor, request: ActRequest | null) => string | null

const unless = (holds: boolean, sentence: string): string | null => (holds ? null : sentence)

/** While the client only asks which buttons to show there is no request yet: what comes with the act is not missed. */
const given = (
  request: ActRequest | null,
  has: (r: ActRequest) => boolean,
  sentence: string,
): string | null => (request === null || has(request) ? null : sentence)

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`

const designed = (f: JobFacts, personId: string): boolean =>
  personId === f.designerId || (f.designerIds ?? []).includes(personId)

const filled = (text: string | undefined): boolean => (text ?? '').trim().length > 0

export const guards = {
  packetRendered: (f) =>
    unless(
      (f.packetA?.sha256 ?? null) !== null,
      'The packet of this very design is not made yet. Make the packet first.',
    ),
  technicallyChecked: (f) =>
    unless(f.technicalCheck !== null, 'The technical check of this packet is not done yet.'),
  checkerDidNotDesign: (f) =>
    unless(
      f.technicalCheck === null || !designed(f, f.technicalCheck.checkerId),
      'The technical check was made by the designer. Another person must check it.',
    ),
  checkerWithinLimits: (f) =>
    unless(
      f.technicalCheck === null || f.technicalCheck.withinLimits,
      'The design is beyond the approval limits of the person who checked it.',
    ),
  noFailingCheck: (f) =>
    unless(
      f.failingChecksWithoutVariance === 0,
      `${counted(f.failingChecksWithoutVariance, 'criteria check fails', 'criteria checks fail')} without a variance.`,
    ),
  noOpenNote: (f) =>
    unless(
      f.openNotes === 0,
      `${counted(f.openNotes, 'note is', 'notes are')} still open. Answer and settle each.`,
    ),
  landownerReachable: (f) =>
    unless(f.landownerAddressKnown, 'The landowner has neither an e-mail nor a postal address.'),
  isSigner: (f, a) => unless(f.requiredSignerIds.includes(a.personId), 'You are not a signer of this job.'),
  signerIsNoJudge: (f, a) =>
    unless(
      !designed(f, a.personId) && f.technicalCheck?.checkerId !== a.personId,
      'You designed or checked this packet, so you cannot sign it.',
    ),
  notSignedYet: (f, a) =>
    unless(!f.signedByIds.includes(a.personId), 'You have signed this revision already.'),
  hasSigned: (f, a) => unless(f.signedByIds.includes(a.personId), 'You have not signed this revision.'),
  hasConsented: (f, a) =>
    unless(f.consentedIds.includes(a.personId), 'You have not agreed to electronic records yet.'),
  hasRead: (f, a) => unless(f.hasReadIds.includes(a.personId), 'You have not opened every page yet.'),
  hashMatches: (f, _a, r) =>
    given(
      r,
      (q) => f.packetA !== null && q.packetSha256 === f.packetA.sha256,
      'This is not the packet that is in force now. Open the newest revision and read it again.',
    ),
  hasNote: (_f, _a, r) => given(r, (q) => filled(q.note), 'Say in a note what should change.'),
  hasNotes: (_f, _a, r) =>
    given(r, (q) => (q.notes ?? 0) > 0, 'Write at least one note that says what should change.'),
  hasReason: (_f, _a, r) => given(r, (q) => filled(q.reason), 'Give a reason.'),
  notDesigner: (f, a) =>
    unless(!designed(f, a.personId), 'You made this design. Another person must decide.'),
  notPayeeOrKin: (f, a) =>
    unless(
      !f.payeeAndKinIds.includes(a.personId),
      'You or your kin are paid by this job. Another person must decide.',
    ),
  checkerMayDecide: (f, a) =>
    unless(
      f.checkerMayApprove || f.technicalCheck?.checkerId !== a.personId,
      'You made the technical check, and this district wants another person to approve.',
    ),
  signaturesStand: (f) =>
    unless(
      f.requiredSignerIds.length > 0 && f.requiredSignerIds.every((id) => f.signedByIds.includes(id)),
      'Not every signer has signed this revision.',
    ),
  budgetLeft: (f) => unless(f.budgetLeft, 'The fund has no money left for this job.'),
  finalPacketReady: (f) =>
    unless(
      (f.packetB?.sha256 ?? null) !== null,
      'The approved packet is still being made. Try again in a moment.',
    ),
  addressConfirmed: (_f, _a, r) =>
    given(r, (q) => q.addressConfirmed === true, 'Confirm the address the packet goes to.'),
  permitsRecorded: (f) => unless(f.permitsRecorded, 'The permits are not recorded yet.'),
  utilityTicketRecorded: (f) =>
    unless(f.utilityTicketRecorded, 'The ticket of the utility-locating service is not recorded yet.'),
  allMeasured: (f) => unless(f.everyQuantityMeasured, 'Not every quantity has been measured.'),
  ticketsMatch: (f) => unless(f.ticketsMatch, 'The load tickets do not match the measured stone.'),
  notMeasurer: (f, a) =>
    unless(a.personId !== f.measurerId, 'You measured this work. Another person must decide.'),
  mayCertify: (f, a) =>
    unless(f.certifierIds.includes(a.personId), 'Your certifying limits do not cover this job.'),
  noChangeOrderOpen: (f) => unless(!f.changeOrderOpen, 'A change order is still open.'),
  withinPayable: (f) => unless(f.finalPaymentWithinPayable, 'The amount is more than what is payable.'),
  inspectionDatesSet: (f) => unless(f.inspectionDatesSet, 'Set the inspection dates first.'),
} as const satisfies Record<string, Guard>

export type GuardName = keyof typeof guards
