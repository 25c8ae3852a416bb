import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useState } from 'react'
import { useTranslation } from 'react-i18next'
import { useAct } from '../../api/jobs'
import { ActButton } from '../../components/feedback/act-button'
import { TextField } from '../../components/fields/text-field'
import { ActForm } from './act-form'
import { FootBar } from './foot-bar'
import { useActForm } from './use-act-form'

/** Both acts ask for a reason and then once more; their words stand under these names in the catalogue. */
export const reasonActs = { withdraw: 'withdraw', takeBack: 'take-signature-back' } as const

export type ReasonWords = keyof typeof reasonActs

interface ReasonFormProps {
  jobId: string
  words: ReasonWords
  onDone: () => void
}

/** A reason, then a step that says once more what will happen. The reason typed stays through both. */
export function ReasonForm({ jobId, words, onDone }: ReasonFormProps) {
  const { t } = useTranslation()
  const act = useAct(jobId)
  const form = useActForm({ action: reasonActs[words], reason: '' })
  const [isConfirming, setIsConfirming] = useState(false)
  const goOn = form.handleSubmit(async (values) => {
    if (!isConfirming) return setIsConfirming(true)
    if ((await act.mutateAsync(values).catch(() => null)) !== null) onDone()
  })
  const goOnOnce = () => {
    if (!act.isPending) void goOn()
  }
  return (
    <ActForm form={form} label={t(`${words}.title`)} problem={act.error} onSubmit={goOnOnce}>
      {isConfirming ? (
        <Sure
          title={t(`${words}.sure`)}
          intro={t(`${words}.intro`)}
          reason={form.getValues('reason') ?? ''}
        />
      ) : (
        <>
          <Typography sx={{ mb: 4 }}>{t(`${words}.intro`)}</Typography>
          <TextField name="reason" label={t(`${words}.reason`)} rows={4} />
        </>
      )}
      <FootBar>
        <ActButton
          words={t(isConfirming ? `${words}.yes` : `${words}.act`)}
          busyWords={t(`${words}.acting`)}
          isBusy={act.isPending}
          isMain
          onAct={goOnOnce}
        />
        {isConfirming && <Button onClick={() => setIsConfirming(false)}>{t('confirm.back')}</Button>}
      </FootBar>
    </ActForm>
  )
}

interface SureProps {
  title: string
  intro: string
  reason: string
}

function Sure({ title, intro, reason }: SureProps) {
  const { t } = useTranslation()
  return (
    <Box role="alert" sx={{ borderLeft: 4, borderColor: 'warning.main', pl: 4 }}>
      <Typography variant="h2">{title}</Typography>
      <Typography sx={{ my: 3 }}>{intro}</Typography>
      <Typography sx={{ fontWeight: 600 }}>{t('confirm.yourReason')}</Typography>
      <Typography sx={{ whiteSpace: 'pre-line' }}>{reason}</Typography>
    </Box>
  )
}
