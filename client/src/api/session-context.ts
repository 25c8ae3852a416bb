import { createContext, useContext } from 'react'
import { reachOf, type Permission, type SessionView } from 'shared'

export const SessionContext = createContext<SessionView | null>(null)

/** Who is signed in. Only below a shell, which shows its pages to nobody else. */
export function useSession(): SessionView {
  const session = useContext(SessionContext)
  if (session === null) throw new Error('useSession needs a shell around it')
  return session
}

/** May this person do this in the district of the session at all? The server decides again for each thing. */
export function useMay(): (permission: Permission) => boolean {
  const { personId, district, roles } = useSession()
  return (permission) => reachOf({ personId, districtId: district.id, roles }, permission) !== null
}
