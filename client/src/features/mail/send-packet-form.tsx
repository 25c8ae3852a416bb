import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { actSchema, type Act, type JobView } from 'shared'
import { useAct } from '../../api/jobs'
import { ActButton } from '../../components/feedback/act-button'
import { CheckField } from '../../components/fields/check-field'
import { Form } from '../../components/fields/form'
import { readSchema } from '../../components/fields/read-schema'
import { SubmitButton } from '../../components/fields/submit-button'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface SendDraft {
  addressConfirmed: boolean
}

const sendSchema = readSchema<SendDraft, Act>(actSchema, ({ addressConfirmed }) => ({
  action: 'send',
  addressConfirmed,
})).refine((act) => act.action !== 'send' || act.addressConfirmed, {
  path: ['addressConfirmed'],
  message: 'Tick that the addresses are right, or correct them under Producers first',
})

interface SendPacketFormProps {
  job: Pick<JobView, 'id' | 'actions'>
}

/** One press makes one message to each addressee, however often it is pressed. */
export function SendPacketForm({ job }: SendPacketFormProps) {
  const act = useAct(job.id)
  const form = useSchemaForm(sendSchema, { addressConfirmed: false })
  const offered = job.actions.find(({ action }) => action === 'send')
  if (!offered) return null
  if (!offered.enabled) {
    return (
      <Box sx={{ my: 4 }}>
        <ActButton words={offered.words} reasons={offered.reasons} isBlocked onAct={() => undefined} />
      </Box>
    )
  }
  return (
    <Form
      form={form}
      problem={act.error}
      label={offered.words}
      onSubmit={(values) => act.mutateAsync(values)}
    >
      <Box sx={{ display: 'grid', gap: 3, my: 4 }}>
        <CheckField name="addressConfirmed" label="I have looked at the addresses, and they are right" />
        <div>
          <SubmitButton words={offered.words} busyWords="Sending…" />
        </div>
        <Typography variant="body2" sx={{ color: 'text.secondary' }}>
          What is sent cannot be called back.
        </Typography>
      </Box>
    </Form>
  )
}
