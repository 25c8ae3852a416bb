import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { EventView } from 'shared'
import { useSession } from '../../api/session-context'
import { EmptyState } from '../../components/feedback/empty-state'
import { Section } from '../../components/layout/section'
import { eventsByDay, type TimedEvent } from './events-by-day'

interface TimelineProps {
  events: readonly EventView[]
}

export function Timeline({ events }: TimelineProps) {
  const { district } = useSession()
  if (events.length === 0) {
    return <EmptyState title="Nothing has happened yet">Every act on this job will stand here.</EmptyState>
  }
  return (
    <>
      <Typography sx={{ color: 'text.secondary' }}>
        Newest first. The digits at the end of a line are the start of its fingerprint, which covers the line
        before it too: no line can be changed or taken out unseen.
      </Typography>
      {eventsByDay(events, district.timeZone).map(({ day, events: lines }) => (
        <Section key={day} title={day}>
          <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
            {lines.map((event) => (
              <TimelineLine key={event.sequence} event={event} />
            ))}
          </Box>
        </Section>
      ))}
    </>
  )
}

function FoldedLines({ events }: { events: readonly EventView[] }) {
  return (
    <details>
      <summary>Each page</summary>
      <Box component="ul" sx={{ m: 0, pl: 4 }}>
        {events.map(({ sequence, sentence, rowHash }) => (
          <li key={sequence}>
            {sentence} <span title={rowHash}>{rowHash.slice(0, HASH_SHOWN)}</span>
          </li>
        ))}
      </Box>
    </details>
  )
}

const HASH_SHOWN = 8

function TimelineLine({ event }: { event: TimedEvent }) {
  const muted = { color: 'text.secondary' }
  return (
    <Box
      component="li"
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr auto', sm: '96px minmax(0, 1fr) auto' },
        columnGap: 4,
        py: 2,
        borderBottom: 1,
        borderColor: 'divider',
      }}
    >
      <Box component="time" dateTime={event.at} className="figure" sx={muted}>
        {event.time}
      </Box>
      <Typography component="div" sx={{ gridColumn: { xs: '1 / -1', sm: 2 }, gridRow: { xs: 2, sm: 1 } }}>
        {event.sentence}
        {event.folded.length > 0 && <FoldedLines events={event.folded} />}
      </Typography>
      <Typography
        variant="body2"
        className="figure"
        title={event.rowHash}
        sx={{ ...muted, gridColumn: { xs: 2, sm: 3 }, gridRow: 1 }}
      >
        <span className="visually-hidden">fingerprint </span>
        {event.rowHash.slice(0, HASH_SHOWN)}
      </Typography>
    </Box>
  )
}
