import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import { useEffect, useRef } from 'react'
import { RuledTable, type Column } from '../layout/ruled-table'

export interface Difference {
  label: string
  mine: string
  theirs: string
}

interface StaleChoiceProps {
  /** Who saved what in between. */
  sentence: string
  differences: readonly Difference[]
  onKeepMine: () => void
  onTakeTheirs: () => void
  isBusy?: boolean
}

const MOST_SHOWN = 20
const columns: readonly Column[] = [
  { key: 'field', title: 'Field' },
  { key: 'mine', title: 'Yours, not saved', isFigure: true },
  { key: 'theirs', title: 'Theirs, saved', isFigure: true },
]

/** Somebody else saved in between: what differs, and whose is kept. Nothing typed is lost until one decides. */
export function StaleChoice(props: StaleChoiceProps) {
  const { sentence, differences, onKeepMine, onTakeTheirs, isBusy = false } = props
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => box.current?.focus(), [])
  const more = differences.length - MOST_SHOWN
  return (
    <Box
      ref={box}
      role="alert"
      tabIndex={-1}
      sx={{ border: 2, borderColor: 'warning.main', p: 4, my: 4, maxWidth: 720 }}
    >
      <Typography variant="h3" component="h2">
        Somebody saved in between
      </Typography>
      <Typography sx={{ mt: 1 }}>{sentence} What you typed is still here.</Typography>
      {differences.length > 0 && (
        <RuledTable caption="What differs" columns={columns}>
          {differences.slice(0, MOST_SHOWN).map(({ label, mine, theirs }) => (
            <TableRow key={label}>
              <TableCell component="th" scope="row">
                {label}
              </TableCell>
              <TableCell align="right">{mine}</TableCell>
              <TableCell align="right">{theirs}</TableCell>
            </TableRow>
          ))}
        </RuledTable>
      )}
      {more > 0 && <Typography variant="body2">And {more} more.</Typography>}
      {differences.length === 0 && <Typography>Both say the same.</Typography>}
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 3, mt: 4 }}>
        <Button aria-disabled={isBusy} onClick={isBusy ? undefined : onKeepMine}>
          Save mine over it
        </Button>
        <Button aria-disabled={isBusy} onClick={isBusy ? undefined : onTakeTheirs}>
          Take theirs
        </Button>
      </Box>
    </Box>
  )
}
