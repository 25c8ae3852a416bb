import { useTranslation } from 'react-i18next'
import Box from '@mui/material/Box'
import { LinkButton } from '../../components/layout/link-button'
import { FootBar } from './foot-bar'

interface PageTurnProps {
  jobId: string
  page: number
  last: number
  /** Where the last page leads: to the signature when it is this person's turn. */
  signWords: string | null
}

/** Earlier and next, always at the same place. */
export function PageTurn({ jobId, page, last, signWords }: PageTurnProps) {
  const { t } = useTranslation()
  const isLast = page >= last
  return (
    <FootBar>
      {isLast && <Box role="status">{t('read.last')}</Box>}
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 3 }}>
        {page > 1 && <LinkButton to={`/my/${jobId}/read/${page - 1}`} words={t('read.earlier')} />}
        {!isLast && <LinkButton to={`/my/${jobId}/read/${page + 1}`} words={t('read.next')} isMain />}
        {isLast && signWords !== null && <LinkButton to={`/my/${jobId}/sign`} words={signWords} isMain />}
        {isLast && signWords === null && <LinkButton to={`/my/${jobId}`} words={t('read.back')} isMain />}
      </Box>
    </FootBar>
  )
}
