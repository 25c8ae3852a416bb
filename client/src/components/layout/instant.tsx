import { formatInstant } from 'shared'
import { useSession } from '../../api/session-context'

interface InstantProps {
  at: string
}

/** A moment in the district's own zone. */
export function Instant({ at }: InstantProps) {
  const { district } = useSession()
  return (
    <time dateTime={at} style={{ whiteSpace: 'nowrap' }}>
      {formatInstant(at, district.timeZone)}
    </time>
  )
}
