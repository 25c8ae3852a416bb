import Box from '@mui/material/Box'
import { useState } from 'react'
import { actSchema, type Act, type JobView, type OfferedAction } from 'shared'
import { useAct } from '../../api/jobs'
import { ActButton } from '../../components/feedback/act-button'
import { Form } from '../../components/fields/form'
import { readSchema } from '../../components/fields/read-schema'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'
import { ApproveDialog } from './approve-dialog'

interface ApproveDraft {
  /** Of the very packet on this page, so that no other can be approved by it. */
  packetSha256: string
  meetingDate?: string
  agendaItem?: string
}

const approveSchema = readSchema<ApproveDraft, Act>(actSchema, (draft) => ({ action: 'approve', ...draft }))

interface ApproveFormProps {
  job: Pick<JobView, 'id'>
  offered: OfferedAction
  revision: number
  packetSha256: string
}

export function ApproveForm({ job, offered, revision, packetSha256 }: ApproveFormProps) {
  const act = useAct(job.id)
  const [toConfirm, setToConfirm] = useState<Act | null>(null)
  const form = useSchemaForm(approveSchema, { packetSha256 })
  if (!offered.enabled) {
    return <ActButton words={offered.words} reasons={offered.reasons} isBlocked onAct={() => undefined} />
  }
  return (
    <>
      <Form form={form} problem={act.error} label={offered.words} onSubmit={setToConfirm}>
        <Box sx={{ display: 'grid', gap: 3, mb: 4 }}>
          <TextField name="meetingDate" label="Date of the meeting" type="date" isOptional />
          <TextField name="agendaItem" label="Item of the agenda" isOptional />
        </Box>
        <SubmitButton words={`${offered.words} revision ${revision}`} busyWords="Approving…" />
      </Form>
      <ApproveDialog
        isOpen={toConfirm !== null}
        isBusy={act.isPending}
        revision={revision}
        words={offered.words}
        onClose={() => setToConfirm(null)}
        onApprove={() => toConfirm && act.mutate(toConfirm, { onSettled: () => setToConfirm(null) })}
      />
    </>
  )
}
