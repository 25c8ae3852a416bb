import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useId } from 'react'

interface ActButtonProps {
  words: string
  onAct: () => void
  /** What still blocks the act; the button keeps its place and says so. */
  reasons?: readonly string[]
  isBlocked?: boolean
  isBusy?: boolean
  busyWords?: string
  /** The one filled button of its region. */
  isMain?: boolean
}

/** An act that may be blocked: then it stays where it is, dashed, with the reasons beside it. */
export function ActButton(props: ActButtonProps) {
  const { words, onAct, reasons = [], isBlocked = reasons.length > 0, isBusy = false, isMain = false } = props
  const reasonId = useId()
  const isIdle = !isBlocked && !isBusy
  return (
    <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: 3 }}>
      <Button
        variant={isMain && !isBlocked ? 'contained' : 'outlined'}
        color={isMain && !isBlocked ? 'primary' : 'inherit'}
        aria-disabled={!isIdle}
        aria-describedby={reasons.length > 0 ? reasonId : undefined}
        onClick={isIdle ? onAct : undefined}
        sx={isBlocked ? { borderStyle: 'dashed', color: 'text.secondary', cursor: 'not-allowed' } : undefined}
      >
        {isBusy ? (props.busyWords ?? 'Working…') : words}
      </Button>
      {reasons.length > 0 && (
        <Box id={reasonId} sx={{ flex: '1 1 240px', minWidth: 0 }}>
          {reasons.map((reason) => (
            <Typography key={reason} variant="body2">
              {reason}
            </Typography>
          ))}
        </Box>
      )}
    </Box>
  )
}
