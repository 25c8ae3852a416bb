import { describe, expect, it } from 'vitest'
import { actSchema, edges, guards, type GuardName, type JobFacts } from 'shared'
import { i18next } from '../../i18n/i18n'
import { sentenceKey } from './shared-sentences'

const me = { personId: 'me', districtId: 'd', roles: ['landowner'] } as const
const nobody = {
  requiredSignerIds: [],
  signedByIds: [],
  consentedIds: [],
  hasReadIds: [],
  packetA: null,
} as unknown as JobFacts

/** What a guard says when its condition is not met: these fail on a person who did something, not on one who did not. */
const done: Partial<Record<GuardName, Partial<JobFacts>>> = {
  notSignedYet: { signedByIds: ['me'] },
  signerIsNoJudge: { designerId: 'me' },
}

const sentenceOf = (name: GuardName) => {
  const facts = { ...nobody, ...done[name] }
  return guards[name](facts, me, { note: '', reason: '' }) ?? ''
}

const landownerGuards = [
  ...new Set(edges.filter(({ roles }) => roles.includes('landowner')).flatMap((edge) => edge.guards)),
]

describe('sentences of shared', () => {
  it.each(landownerGuards)('has words in the catalogue for what %s says to a landowner', (name) => {
    const key = sentenceKey(sentenceOf(name))
    expect(key).not.toBeNull()
    expect(i18next.exists(key ?? '')).toBe(true)
  })

  it.each([
    { action: 'sign', typedName: ' ', packetSha256: 'a'.repeat(64) },
    { action: 'sign', typedName: 'n'.repeat(121), intends: true, packetSha256: 'a'.repeat(64) },
    { action: 'ask-for-changes', note: '' },
    { action: 'withdraw', reason: '\u0007' },
  ])('has words in the catalogue for what is wrong in a form: $action', (fields) => {
    const issues = actSchema.safeParse(fields).error?.issues ?? []
    expect(issues).not.toEqual([])
    expect(issues.map(({ message }) => sentenceKey(message))).not.toContain(null)
  })

  it('knows no sentence that is not in its list', () => {
    expect(sentenceKey('The permits are not recorded yet.')).toBeNull()
  })
})
