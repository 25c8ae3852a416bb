import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Dialog from '@mui/material/Dialog'
import DialogActions from '@mui/material/DialogActions'
import DialogContent from '@mui/material/DialogContent'
import Typography from '@mui/material/Typography'
import { useId, useState } from 'react'
import type { ScheduleView } from 'shared'
import { usePutScheduleInForce } from '../../api/schedules'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import type { NamedLine } from './unmapped-lines'

interface PutScheduleInForceProps {
  schedule: ScheduleView
  /** Lines that pay for nothing of ours. */
  unmapped: readonly NamedLine[]
  reasons: readonly string[]
}

/** A real schedule pays for much that no ramp needs; one that pays for nothing at all is a mistake. */
const paysForNothing = ({ kind, lines }: ScheduleView, unmapped: number): boolean =>
  kind === 'unit-rate' && unmapped === lines.length

export function PutScheduleInForce({ schedule, unmapped, reasons }: PutScheduleInForceProps) {
  const put = usePutScheduleInForce(schedule.id)
  const [isAsking, setIsAsking] = useState(false)
  const titleId = useId()
  const blocks = paysForNothing(schedule, unmapped.length)
    ? [...reasons, 'Map at least one line: a rate for each unit that no line is mapped to pays nothing.']
    : reasons
  const close = () => setIsAsking(false)
  return (
    <Box sx={{ mt: 6 }}>
      <ActButton words="Put in force" reasons={blocks} isMain onAct={() => setIsAsking(true)} />
      <Dialog open={isAsking} onClose={close} aria-labelledby={titleId}>
        <DialogContent>
          <Typography variant="h2" id={titleId}>
            Put {schedule.name} in force?
          </Typography>
          <Typography sx={{ my: 3 }}>
            After this it can never be edited, neither a rate nor what a line pays for. It takes the place of
            the schedule “{schedule.key}” that is in force now, if there is one; jobs already signed keep
            theirs.
          </Typography>
          {unmapped.length > 0 && <UnmappedList lines={unmapped} />}
          <ProblemAlert error={put.error} />
        </DialogContent>
        <DialogActions>
          <Button onClick={close}>Not yet</Button>
          <Button
            variant="contained"
            color="primary"
            aria-disabled={put.isPending}
            onClick={() => {
              if (!put.isPending) put.mutate(undefined, { onSuccess: close })
            }}
          >
            {put.isPending ? 'Putting in force…' : 'Put in force for good'}
          </Button>
        </DialogActions>
      </Dialog>
    </Box>
  )
}

function UnmappedList({ lines }: { lines: readonly NamedLine[] }) {
  return (
    <>
      <Typography sx={{ fontWeight: 600, color: 'warning.main' }}>
        {lines.length === 1 ? 'One line pays for nothing' : `${lines.length} lines pay for nothing`}, and that
        cannot be mended later:
      </Typography>
      <Box component="ul" sx={{ maxHeight: 200, overflowY: 'auto', m: 0, pl: 5 }} tabIndex={0}>
        {lines.map(({ code, title }) => (
          <li key={code}>
            {code}, {title}
          </li>
        ))}
      </Box>
    </>
  )
}
