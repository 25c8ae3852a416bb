import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useRef } from 'react'
import { useReadNotesCsv } from '../../api/surveys'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { StatusLine } from '../../components/feedback/status-line'
import { noteColumns, type GridRow } from './grid-columns'
import { writeRows } from './grid-rows'

interface LevelNotesCsvProps {
  onRead: (rows: readonly GridRow[]) => void
}

/** Level notes from a file, in place of the rows that stand there; the rows before come back with Undo. */
export function LevelNotesCsv({ onRead }: LevelNotesCsvProps) {
  const read = useReadNotesCsv()
  const input = useRef<HTMLInputElement>(null)

  const take = (file: File | undefined) => {
    if (file === undefined || read.isPending) return
    read.mutate(file, { onSuccess: ({ rows }) => onRead(writeRows(noteColumns, rows)) })
    // The same file can be chosen again after it was mended.
    if (input.current) input.current.value = ''
  }

  const count = read.data?.rows.length ?? 0
  return (
    <Box sx={{ mt: 3 }}>
      <Button aria-disabled={read.isPending} onClick={() => input.current?.click()}>
        {read.isPending ? 'Reading…' : 'Read a CSV file'}
      </Button>
      <input
        ref={input}
        type="file"
        accept=".csv,text/csv,text/plain"
        className="visually-hidden"
        tabIndex={-1}
        aria-label="CSV file of level notes"
        onChange={(event) => take(event.target.files?.[0])}
      />
      <Typography variant="body2" sx={{ color: 'text.secondary', mt: 1 }}>
        First row: label, station, bs, is, fs, water_depth. The file takes the place of the rows above.
      </Typography>
      <ProblemAlert error={read.error} />
      <StatusLine
        words={read.isSuccess ? `${count} ${count === 1 ? 'row' : 'rows'} read from the file.` : null}
      />
      {read.data && read.data.errors.length > 0 && (
        <Box role="alert" sx={{ borderLeft: 4, borderColor: 'error.main', pl: 4, my: 3 }}>
          <Typography sx={{ fontWeight: 600 }}>
            These figures could not be read and were left empty. Type them in, or mend the file.
          </Typography>
          <Box component="ul" sx={{ m: 0, pl: 5 }}>
            {read.data.errors.map(({ row, column, message }) => (
              <li key={`${row} ${column ?? ''} ${message}`}>{message}</li>
            ))}
          </Box>
        </Box>
      )}
    </Box>
  )
}
