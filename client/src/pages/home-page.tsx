import { Navigate } from 'react-router-dom'
import { useSession } from '../api/session-context'

/** A mailed link opens one job; everybody else begins at the desk. */
export function HomePage() {
  const { jobId } = useSession()
  return <Navigate to={jobId === null ? '/desk' : `/my/${jobId}`} replace />
}
