import MuiLink from '@mui/material/Link'
import { packetFileUrl } from '../../api/packets'

interface DownloadLinkProps {
  packetId: string
  words: string
}

/** The PDF itself, to keep. */
export function DownloadLink({ packetId, words }: DownloadLinkProps) {
  return (
    <MuiLink
      href={packetFileUrl(packetId)}
      download
      sx={{ display: 'inline-flex', alignItems: 'center', minHeight: 44 }}
    >
      {words}
    </MuiLink>
  )
}
