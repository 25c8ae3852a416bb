import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import MuiLink from '@mui/material/Link'
import { useTranslation } from 'react-i18next'
import { packetFileUrl } from '../../api/packets'

interface PdfViewProps {
  packetId: string
  page: number
  title: string
  isShown: boolean
  onToggle: () => void
}

/** The PDF at one page, where the browser can show it, and a link for where it cannot. */
export function PdfView({ packetId, page, title, isShown, onToggle }: PdfViewProps) {
  const { t } = useTranslation()
  const address = `${packetFileUrl(packetId)}#page=${page}`
  const link = (
    <MuiLink
      href={address}
      target="_blank"
      rel="noopener"
      sx={{ display: 'inline-flex', alignItems: 'center', minHeight: 44 }}
    >
      {t('read.openPdf')}
    </MuiLink>
  )
  return (
    <>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, alignItems: 'center' }}>
        <Button aria-expanded={isShown} onClick={onToggle}>
          {isShown ? t('read.hidePdf') : t('read.asPdf')}
        </Button>
        {link}
      </Box>
      {isShown && (
        // Without the key a browser keeps showing the page it opened first.
        <object
          key={address}
          data={address}
          type="application/pdf"
          aria-label={title}
          style={{ width: '100%', height: '70vh', marginTop: 12 }}
        >
          {link}
        </object>
      )}
    </>
  )
}
