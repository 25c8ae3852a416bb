import Typography from '@mui/material/Typography'
import { useTranslation } from 'react-i18next'
import { LinkButton } from '../../components/layout/link-button'

interface AfterActProps {
  jobId: string
  /** What happens next. */
  sentence: string
}

/** What comes after an act, and the way back. The title of the page says what was done. */
export function AfterAct({ jobId, sentence }: AfterActProps) {
  const { t } = useTranslation()
  return (
    <>
      <Typography role="status" sx={{ my: 4 }}>
        {sentence}
      </Typography>
      <LinkButton to={`/my/${jobId}`} words={t('sign.doneAgain')} isMain />
    </>
  )
}
