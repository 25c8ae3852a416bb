import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ScheduleView } from 'shared'
import { usePutScheduleInForce } from '../../api/schedules'
import { InForceButton } from '../../components/feedback/in-force-button'
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
  const blocks = paysForNothing(schedule, unmapped.length)
    ? [...reasons, 'Map at least one line: a rate for each unit that no line is mapped to pays nothing.']
    : reasons
  return (
    <Box sx={{ mt: 6 }}>
      <InForceButton words="Put in force" name={schedule.name} reasons={blocks} put={put}>
        <Typography sx={{ my: 3 }}>
          After this it can never be edited, neither a rate nor what a line pays for. It takes the place of
          the schedule “{schedule.key}” that is in force now, if there is one; jobs already signed keep
          theirs.
        </Typography>
        {unmapped.length > 0 && <UnmappedList lines={unmapped} />}
      </InForceButton>
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
