import { useCallback, useMemo, useRef } from 'react'
import { isCertainRefusal } from './problem-error'

interface Held {
  key: string
  body: string
}

/**
 * One idempotency key for one intention. The same body pressed twice, or again after a lost answer, carries the same
 * key; a changed body, a success or a certain refusal opens a new intention.
 */
export function useIntention() {
  const held = useRef<Held | null>(null)

  const keyFor = useCallback((body: unknown): string => {
    const text = JSON.stringify(body)
    if (held.current?.body !== text) held.current = { key: crypto.randomUUID(), body: text }
    return held.current.key
  }, [])

  const run = useCallback(
    async <T>(body: unknown, send: (idempotencyKey: string) => Promise<T>): Promise<T> => {
      try {
        const answer = await send(keyFor(body))
        held.current = null
        return answer
      } catch (error) {
        if (isCertainRefusal(error)) held.current = null
        throw error
      }
    },
    [keyFor],
  )

  return useMemo(() => ({ run }), [run])
}
