import Box from '@mui/material/Box'
import MuiLink from '@mui/material/Link'
import type { PacketView } from 'shared'
import { packetFileUrl } from '../../api/packets'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'
import { sizeText } from './size-text'

interface PacketFactsProps {
  packet: PacketView
}

/** What identifies a packet that is made, and the way to its bytes. */
export function PacketFacts({ packet }: PacketFactsProps) {
  const { id, revision, pages, sizeBytes, sha256 } = packet
  return (
    <Box sx={{ maxWidth: 560 }}>
      <FigureRows>
        <FigureRow label="Revision" value={<strong>{revision}</strong>} />
        <FigureRow label="Pages" value={pages.length} />
        <FigureRow
          label="File"
          value={
            <MuiLink href={packetFileUrl(id)} download>
              Download the PDF{sizeBytes === null ? '' : `, ${sizeText(sizeBytes)}`}
            </MuiLink>
          }
        />
        <FigureRow
          label={<span style={{ whiteSpace: 'nowrap' }}>SHA-256</span>}
          value={
            <Box component="span" sx={{ overflowWrap: 'anywhere', fontSize: '0.8125rem' }}>
              {sha256}
            </Box>
          }
        />
      </FigureRows>
    </Box>
  )
}
