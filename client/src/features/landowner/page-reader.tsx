import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useEffect } from 'react'
import { useTranslation } from 'react-i18next'
import type { PacketView } from 'shared'
import { useReadPage } from '../../api/packets'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { LandownerProblem } from './landowner-problem'
import { PageText } from './page-text'

interface PageReaderProps {
  packet: PacketView
  page: PacketView['pages'][number]
}

/** One page as text. Opening it is what counts as reading it, and the server is told so once. */
export function PageReader({ packet, page }: PageReaderProps) {
  const { t } = useTranslation()
  const { mutate, error } = useReadPage(packet.id)
  const isRead = packet.pagesReadByMe.includes(page.number)
  useEffect(() => {
    if (!isRead) mutate(page.number)
  }, [isRead, page.number, mutate])
  return (
    <>
      <Box role="status" sx={{ minHeight: 24 }}>
        {isRead && <VerdictMark kind="pass" words={t('read.marked')} />}
      </Box>
      <LandownerProblem error={error}>
        <Button variant="text" onClick={() => mutate(page.number)}>
          {t('shell.tryAgain')}
        </Button>
      </LandownerProblem>
      <Typography variant="body2" sx={{ color: 'text.secondary' }}>
        {t('read.asText')}. {t('read.inEnglish')}
      </Typography>
      <PageText lines={page.text} />
    </>
  )
}
