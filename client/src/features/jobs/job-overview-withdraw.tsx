import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useState } from 'react'
import { actSchema, type Act, type JobView } from 'shared'
import { useAct } from '../../api/jobs'
import { Form } from '../../components/fields/form'
import { readSchema } from '../../components/fields/read-schema'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface WithdrawDraft {
  reason: string
}

const withdrawSchema = readSchema<WithdrawDraft, Act>(actSchema, ({ reason }) => ({
  action: 'withdraw',
  reason,
}))

interface JobOverviewWithdrawProps {
  job: JobView
}

/** Ends a job that will not be built. It cannot be undone, so it opens first and asks for a reason. */
export function JobOverviewWithdraw({ job }: JobOverviewWithdrawProps) {
  const [isOpen, setIsOpen] = useState(false)
  const act = useAct(job.id)
  const form = useSchemaForm(withdrawSchema, { reason: '' })
  if (!isOpen) {
    return (
      <Button sx={{ my: 4 }} onClick={() => setIsOpen(true)}>
        Withdraw this job
      </Button>
    )
  }
  return (
    <Box sx={{ my: 4, maxWidth: 560 }}>
      <Form
        form={form}
        problem={act.error}
        label="Withdraw this job"
        onSubmit={(values) => act.mutateAsync(values)}
      >
        <Typography>A withdrawn job stays readable. It cannot be taken up again.</Typography>
        <Box sx={{ my: 3 }}>
          <TextField name="reason" label="Reason" hint="It stands in the timeline." rows={3} />
        </Box>
        <Box sx={{ display: 'flex', gap: 3 }}>
          <SubmitButton words="Withdraw" busyWords="Withdrawing…" isQuiet />
          <Button variant="text" onClick={() => setIsOpen(false)}>
            Keep the job
          </Button>
        </Box>
      </Form>
    </Box>
  )
}
