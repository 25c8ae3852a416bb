import Typography from '@mui/material/Typography'
import { numberText, type ReducedLevelNotes } from 'shared'
import { VerdictMark, type MarkKind } from '../../components/feedback/verdict-mark'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'
import { Section } from '../../components/layout/section'

interface ReductionPanelProps {
  reduction: ReducedLevelNotes
}

const feet = (value: number): string => numberText(value, 3)

const closingMark = ({ closes, allowableFt }: ReducedLevelNotes): MarkKind => {
  if (allowableFt === undefined) return 'not-applicable'
  return closes === undefined ? 'waiting' : closes ? 'pass' : 'fail'
}

const closingWords: Partial<Record<MarkKind, string>> = {
  pass: 'closes',
  fail: 'does not close',
  'not-applicable': 'no closing bench mark',
  waiting: 'waits for a foresight on the last row',
}

/** The checks of a page of level notes. */
export function ReductionPanel({ reduction }: ReductionPanelProps) {
  const { sumBacksightFt, sumForesightFt, differenceFt, arithmeticCheckPasses } = reduction
  const { setups, misclosureFt, allowableFt } = reduction
  const mark = closingMark(reduction)
  return (
    <>
      <Section title="Arithmetic" aside={<VerdictMark kind={arithmeticCheckPasses ? 'pass' : 'fail'} />}>
        <FigureRows>
          <FigureRow label="Sum of backsights" value={feet(sumBacksightFt)} unit="ft" />
          <FigureRow label="Sum of foresights" value={feet(sumForesightFt)} unit="ft" />
          <FigureRow label="Backsights less foresights" value={feet(differenceFt)} unit="ft" isSum />
          <FigureRow label="Setups of the instrument" value={numberText(setups)} />
        </FigureRows>
        {!arithmeticCheckPasses && (
          <Typography sx={{ mt: 2 }}>
            The sums do not give the difference of the first and last elevation. Look for a sight in the wrong
            column.
          </Typography>
        )}
      </Section>
      <Section title="Closing" aside={<VerdictMark kind={mark} words={closingWords[mark]} />}>
        {allowableFt !== undefined && (
          <FigureRows>
            <FigureRow
              label="Misclosure"
              value={misclosureFt === undefined ? '–' : feet(misclosureFt)}
              unit="ft"
            />
            <FigureRow label="Allowable" value={feet(allowableFt)} unit="ft" />
          </FigureRows>
        )}
        {mark === 'fail' && (
          <Typography sx={{ mt: 2 }}>Look for a misread rod, or run the line again.</Typography>
        )}
      </Section>
    </>
  )
}
