import Box from '@mui/material/Box'
import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import type { RevisionItem } from 'shared'
import { Instant } from '../../components/layout/instant'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'

const columns: readonly Column[] = [
  { key: 'number', title: 'Revision', isFigure: true, width: 80 },
  { key: 'made', title: 'Made' },
  { key: 'hash', title: 'SHA-256 begins' },
  { key: 'signatures', title: 'Signatures' },
]

const HASH_SHOWN = 12

interface JobOverviewRevisionsProps {
  revisions: readonly RevisionItem[]
}

/** Every revision stays readable; signatures of an older one are void and say so. */
export function JobOverviewRevisions({ revisions }: JobOverviewRevisionsProps) {
  if (revisions.length === 0) {
    return (
      <Typography sx={{ my: 4, color: 'text.secondary' }}>
        No revision yet. Making the packet opens it.
      </Typography>
    )
  }
  return (
    <RuledTable caption="Revisions" columns={columns} minWidth={520}>
      {revisions.map(({ number, packetId, madeAt, sha256, signatures }) => (
        <TableRow key={packetId}>
          <FigureCell isStrong>{number}</FigureCell>
          <TableCell>
            <Instant at={madeAt} />
          </TableCell>
          <TableCell className="figure">
            {sha256 === null ? 'not made yet' : sha256.slice(0, HASH_SHOWN)}
          </TableCell>
          <TableCell>
            {signatures.length === 0 && 'none'}
            {signatures.map(({ name, signedAt, isVoid }) => (
              <Box key={`${name} ${signedAt}`}>
                {isVoid ? <s>{name}</s> : name}, <Instant at={signedAt} />
                {isVoid && <strong> void</strong>}
              </Box>
            ))}
          </TableCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
