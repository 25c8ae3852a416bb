import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useWatch } from 'react-hook-form'
import { useTranslation } from 'react-i18next'
import { isOwnName, type JobView, type PacketView } from 'shared'
import { useAct } from '../../api/jobs'
import { useSession } from '../../api/session-context'
import { ActButton } from '../../components/feedback/act-button'
import { CheckField } from '../../components/fields/check-field'
import { TextField } from '../../components/fields/text-field'
import { ActForm } from './act-form'
import { FootBar } from './foot-bar'
import { signingSteps } from './signing-steps'
import { useActForm } from './use-act-form'
import { useStepReasons } from './use-step-reasons'

interface SignFormProps {
  job: JobView
  packet: PacketView
  onSigned: (job: JobView) => void
}

/** Name, tick, button. The button says what still stands before it, and changes as it is done. */
export function SignForm({ job, packet, onSigned }: SignFormProps) {
  const { t } = useTranslation()
  const { name } = useSession()
  const act = useAct(job.id)
  const stepReasons = useStepReasons()
  const form = useActForm({ action: 'sign', typedName: '', packetSha256: packet.sha256 ?? '' })
  const [typedName, intends] = useWatch({ control: form.control, name: ['typedName', 'intends'] })
  const nameReasons = (typed: string): string[] => {
    if (typed.trim() === '') return [t('sign.nameMissing')]
    return isOwnName(typed, name) ? [] : [t('sign.nameOther', { name })]
  }
  const reasons = [
    ...stepReasons(signingSteps(job, packet)),
    ...nameReasons(typedName ?? ''),
    ...(intends ? [] : [t('sign.must')]),
  ]
  const sign = form.handleSubmit(async (values) => {
    const signed = await act.mutateAsync(values).catch(() => null)
    if (signed !== null) onSigned(signed)
  })
  return (
    <ActForm
      form={form}
      label={t('sign.title', { revision: packet.revision })}
      problem={act.error}
      onSubmit={() => {
        if (reasons.length === 0 && !act.isPending) void sign()
      }}
    >
      <Box sx={{ display: 'grid', gap: 4, mt: 6 }}>
        <TextField
          name="typedName"
          label={t('sign.name')}
          hint={t('sign.nameHint', { name })}
          autoComplete="name"
        />
        <CheckField name="intends" label={t('sign.intent')} />
        <Typography variant="body2" sx={{ color: 'text.secondary' }}>
          {t('sign.cannotUndo')}
        </Typography>
      </Box>
      <FootBar>
        <Typography variant="body2">{t('job.noStart')}</Typography>
        <ActButton
          words={t('sign.act', { revision: packet.revision })}
          busyWords={t('sign.acting')}
          reasons={reasons}
          isBusy={act.isPending}
          isMain
          onAct={() => void sign()}
        />
      </FootBar>
    </ActForm>
  )
}
