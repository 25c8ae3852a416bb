import { renderHook } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { noConnection, parseProblem } from './problem-error'
import { useIntention } from './use-intention'

const keysOf = () => {
  const keys: string[] = []
  const { result } = renderHook(() => useIntention())
  const press = async (body: unknown, outcome: 'done' | Error) => {
    await result.current
      .run(body, (key) => {
        keys.push(key)
        return outcome === 'done' ? Promise.resolve() : Promise.reject(outcome)
      })
      .catch(() => undefined)
  }
  return { keys, press }
}

describe('useIntention', () => {
  it('keeps the key when the answer was lost, so that the server acts once', async () => {
    const { keys, press } = keysOf()
    await press({ action: 'send' }, noConnection())
    await press({ action: 'send' }, 'done')
    expect(keys[1]).toBe(keys[0])
  })

  it('makes a new key after a success, a refusal or a changed body', async () => {
    const { keys, press } = keysOf()
    const refusal = parseProblem(409, {
      type: 'urn:wadestone:problem:transition-not-allowed',
      title: 'No',
      status: 409,
    })
    await press({ action: 'send' }, 'done')
    await press({ action: 'send' }, refusal)
    await press({ action: 'send' }, noConnection())
    await press({ action: 'send', addressConfirmed: true }, 'done')
    expect(new Set(keys).size).toBe(4)
  })
})
