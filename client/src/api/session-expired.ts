type Listener = () => void

const listeners = new Set<Listener>()
let isExpired = false

const tell = (value: boolean) => {
  if (isExpired === value) return
  isExpired = value
  for (const listener of listeners) listener()
}

/**
 * Whether a request was refused because nobody is signed in any more. The page in hand stays as it is, with all
 * that was typed; a sign-in opens over it.
 */
export const sessionExpired = {
  raise: () => tell(true),
  clear: () => tell(false),
  read: () => isExpired,
  subscribe: (listener: Listener) => {
    listeners.add(listener)
    return () => void listeners.delete(listener)
  },
}
