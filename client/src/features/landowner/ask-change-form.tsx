import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useTranslation } from 'react-i18next'
import type { JobView, PacketView } from 'shared'
import { useAct } from '../../api/jobs'
import { ActButton } from '../../components/feedback/act-button'
import { TextField } from '../../components/fields/text-field'
import { ActForm } from './act-form'
import { FootBar } from './foot-bar'
import { PageChoice } from './page-choice'
import { useActForm } from './use-act-form'

interface AskChangeFormProps {
  job: JobView
  pages: PacketView['pages']
  /** The page one came from. */
  page?: number
  onAsked: () => void
}

export function AskChangeForm({ job, pages, page, onAsked }: AskChangeFormProps) {
  const { t } = useTranslation()
  const act = useAct(job.id)
  const form = useActForm({ action: 'ask-for-changes', note: '', page })
  const ask = form.handleSubmit(async (values) => {
    if ((await act.mutateAsync(values).catch(() => null)) !== null) onAsked()
  })
  const askOnce = () => {
    if (!act.isPending) void ask()
  }
  return (
    <ActForm form={form} label={t('ask.title')} problem={act.error} onSubmit={askOnce}>
      <Typography>{t('ask.intro')}</Typography>
      <Box sx={{ display: 'grid', gap: 4, mt: 4 }}>
        <PageChoice pages={pages} />
        <TextField name="note" label={t('ask.note')} rows={6} />
      </Box>
      <FootBar>
        <ActButton
          words={t('ask.act')}
          busyWords={t('ask.acting')}
          isBusy={act.isPending}
          isMain
          onAct={askOnce}
        />
      </FootBar>
    </ActForm>
  )
}
