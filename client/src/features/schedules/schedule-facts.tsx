import Box from '@mui/material/Box'
import { formatCivilDate, formatPercent, moneyText, type ScheduleView } from 'shared'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'
import { kindWords, percentOfWords } from './schedule-words'

interface ScheduleFactsProps {
  schedule: ScheduleView
}

const percentOrNone = (percent: number | undefined): string | null =>
  percent === undefined ? null : formatPercent(percent, 2)

/** The terms of a schedule, only those that it has. */
export function ScheduleFacts({ schedule }: ScheduleFactsProps) {
  const facts: [string, string | null][] = [
    ['State', schedule.status.replace('-', ' ')],
    ['Name in designs', schedule.key],
    ['Fiscal year', String(schedule.fiscalYear)],
    ['Good from', formatCivilDate(schedule.effectiveFrom)],
    ['Good to', formatCivilDate(schedule.effectiveTo)],
    ['Pays', kindWords[schedule.kind]],
    ['Percent', percentOrNone(schedule.percent)],
    ['Percent at the higher rate', percentOrNone(schedule.higherPercent)],
    ['Percent of', schedule.percentOf ? percentOfWords[schedule.percentOf] : null],
    ['At most', schedule.cap ? moneyText(schedule.cap) : null],
    ['Amount', schedule.amount ? moneyText(schedule.amount) : null],
    ['In advance, at most', percentOrNone(schedule.advancePercent)],
    ['Practices', schedule.practices?.length ? schedule.practices.join(', ') : null],
  ]
  return (
    <Box sx={{ maxWidth: 560 }}>
      <FigureRows>
        {facts.flatMap(([label, value]) =>
          value === null ? [] : [<FigureRow key={label} label={label} value={value} />],
        )}
      </FigureRows>
    </Box>
  )
}
