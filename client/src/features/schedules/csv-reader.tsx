import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useRef } from 'react'
import type { ScheduleLine } from 'shared'
import { useReadScheduleCsv } from '../../api/schedules'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { StatusLine } from '../../components/feedback/status-line'
import { CsvErrors } from './csv-errors'

interface CsvReaderProps {
  onRead: (lines: ScheduleLine[]) => void
}

/** Reads lines from a file. Good rows are taken, the others are listed with what would be right. */
export function CsvReader({ onRead }: CsvReaderProps) {
  const input = useRef<HTMLInputElement>(null)
  const read = useReadScheduleCsv()
  const take = (file: File | undefined) => {
    if (file === undefined || read.isPending) return
    read.mutate(file, {
      onSuccess: ({ lines }) => {
        if (lines.length > 0) onRead(lines)
      },
    })
    // So that the same file, mended, can be chosen once more.
    if (input.current) input.current.value = ''
  }
  return (
    <Box sx={{ my: 4 }}>
      <Typography variant="body2" sx={{ color: 'text.secondary', maxWidth: 640 }}>
        From a spreadsheet, save the lines as CSV. The first row names the columns: code, practice, title,
        unit, base_rate, higher_rate, quantity_key; the last two may be left out. Lines read take the place of
        those below.
      </Typography>
      <Button aria-disabled={read.isPending} onClick={() => input.current?.click()} sx={{ mt: 2 }}>
        {read.isPending ? 'Reading…' : 'Read a CSV file'}
      </Button>
      <input
        ref={input}
        type="file"
        accept=".csv,text/csv"
        aria-label="CSV file of lines"
        className="visually-hidden"
        tabIndex={-1}
        onChange={({ target }) => take(target.files?.[0])}
      />
      <StatusLine words={read.data ? `${read.data.lines.length} lines read.` : null} />
      <ProblemAlert error={read.error} />
      <CsvErrors errors={read.data?.errors ?? []} />
    </Box>
  )
}
