import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import type { ReactNode } from 'react'
import type { CheckResult, Verdict } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { countOf, countText, verdictOrder } from './check-counts'

interface CheckFilterProps {
  checks: readonly CheckResult[]
  shown: Verdict | null
  onShow: (verdict: Verdict | null) => void
}

export const asVerdict = (text: string | null): Verdict | null =>
  verdictOrder.find((verdict) => verdict === text) ?? null

/** How many of each verdict; each count shows only its own. */
export function CheckFilter({ checks, shown, onShow }: CheckFilterProps) {
  return (
    <Box role="group" aria-label="Which checks to show" sx={{ display: 'flex', flexWrap: 'wrap', gap: 2 }}>
      <FilterButton isOn={shown === null} onPress={() => onShow(null)}>
        All {checks.length}
      </FilterButton>
      {verdictOrder.map((verdict) => (
        <FilterButton key={verdict} isOn={shown === verdict} onPress={() => onShow(verdict)}>
          <VerdictMark kind={verdict} words={countText(verdict, countOf(checks, verdict))} />
        </FilterButton>
      ))}
    </Box>
  )
}

interface FilterButtonProps {
  isOn: boolean
  onPress: () => void
  children: ReactNode
}

function FilterButton({ isOn, onPress, children }: FilterButtonProps) {
  return (
    <Button
      aria-pressed={isOn}
      onClick={onPress}
      sx={isOn ? { boxShadow: 'inset 0 0 0 1px var(--ink)' } : { borderColor: 'divider' }}
    >
      {children}
    </Button>
  )
}
