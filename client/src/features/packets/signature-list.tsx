import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { PacketView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Instant } from '../../components/layout/instant'

interface SignatureListProps {
  signatures: PacketView['signatures']
}

/** Who signed and when; a void signature stays in plain sight and says so. */
export function SignatureList({ signatures }: SignatureListProps) {
  if (signatures.length === 0) return <Typography sx={{ py: 2 }}>Nobody has signed this revision.</Typography>
  return (
    <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0 }}>
      {signatures.map(({ name, signedAt, isVoid }) => (
        <Box
          component="li"
          key={`${name} ${signedAt}`}
          sx={{
            display: 'flex',
            flexWrap: 'wrap',
            columnGap: 3,
            py: 2,
            borderBottom: 1,
            borderColor: 'divider',
          }}
        >
          <VerdictMark kind={isVoid ? 'fail' : 'pass'} words={isVoid ? 'void' : 'signed'} />
          <span>
            {isVoid ? <s>{name}</s> : name}, <Instant at={signedAt} />
          </span>
        </Box>
      ))}
    </Box>
  )
}
