import { useEffect, useState } from 'react'

/** The value once it has stood still for a while, so that a search does not run at every letter. */
export function useDebounced<T>(value: T, waitMs: number): T {
  const [settled, setSettled] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), waitMs)
    return () => clearTimeout(timer)
  }, [value, waitMs])
  return settled
}
