import Button from '@mui/material/Button'
import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import type { SessionListItem } from 'shared'
import { useEndSession } from '../../api/session'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { Instant } from '../../components/layout/instant'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import { deviceWords } from './device-words'

const columns: readonly Column[] = [
  { key: 'where', title: 'Device and browser' },
  { key: 'began', title: 'Signed in' },
  { key: 'seen', title: 'Last seen' },
  { key: 'acts', title: '' },
]

interface SessionTableProps {
  sessions: readonly SessionListItem[]
}

/** Where this person is signed in. The session in hand is ended by signing out. */
export function SessionTable({ sessions }: SessionTableProps) {
  const end = useEndSession()
  return (
    <>
      <ProblemAlert error={end.error} />
      <RuledTable caption="Where you are signed in" columns={columns} minWidth={640}>
        {sessions.map(({ id, userAgent, startedAt, lastSeenAt, isThis }) => (
          <TableRow key={id}>
            <TableCell component="th" scope="row" sx={{ overflowWrap: 'anywhere' }}>
              {deviceWords(userAgent)}
            </TableCell>
            <TableCell>
              <Instant at={startedAt} />
            </TableCell>
            <TableCell>
              <Instant at={lastSeenAt} />
            </TableCell>
            <TableCell sx={{ whiteSpace: 'nowrap' }}>
              {isThis ? (
                'this one'
              ) : (
                <Button
                  aria-disabled={end.isPending}
                  aria-label={`End the session on ${userAgent === '' ? 'a device that is not named' : deviceWords(userAgent)}`}
                  onClick={() => {
                    if (!end.isPending) end.mutate(id)
                  }}
                >
                  End it
                </Button>
              )}
            </TableCell>
          </TableRow>
        ))}
      </RuledTable>
    </>
  )
}
