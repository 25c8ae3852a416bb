import { useTranslation } from 'react-i18next'
import Box from '@mui/material/Box'
import { EmptyState } from '../components/feedback/empty-state'
import { TextLink } from '../components/layout/text-link'

/** The landowner's session is over; the way back is the mailed link. */
export function SignedOutNotice() {
  const { t } = useTranslation()
  return (
    <Box sx={{ px: { xs: 4, md: 6 } }} role="alert">
      <EmptyState
        title={t('shell.gone')}
        action={<TextLink to="/sign-in">{t('shell.staffSignIn')}</TextLink>}
      >
        {t('shell.goneHow')}
      </EmptyState>
    </Box>
  )
}
