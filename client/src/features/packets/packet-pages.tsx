import Box from '@mui/material/Box'
import MuiLink from '@mui/material/Link'
import type { PacketView } from 'shared'
import { packetFileUrl } from '../../api/packets'

interface PacketPagesProps {
  packet: PacketView
}

/** Every page by its title. Each opens the PDF there, in a tab of its own, so that the page in hand stays. */
export function PacketPages({ packet }: PacketPagesProps) {
  return (
    <Box
      component="ol"
      sx={{
        listStyle: 'none',
        m: 0,
        p: 0,
        columnWidth: '272px',
        columnGap: 6,
        '& li': { breakInside: 'avoid' },
      }}
    >
      {packet.pages.map(({ number, title }) => (
        <Box
          component="li"
          key={number}
          sx={{ display: 'flex', gap: 3, py: 2, borderBottom: 1, borderColor: 'divider' }}
        >
          <Box
            component="span"
            className="figure"
            sx={{ width: 24, textAlign: 'right', color: 'text.secondary' }}
          >
            {number}
          </Box>
          <MuiLink href={`${packetFileUrl(packet.id)}#page=${number}`} target="_blank" rel="noopener">
            {title}
          </MuiLink>
        </Box>
      ))}
    </Box>
  )
}
