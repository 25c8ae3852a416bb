import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'
import { moneyText, type DesignView, type PartFailed, type PartWaiting } from 'shared'
import { Section } from '../../components/layout/section'
import { CostTable } from './cost-table'
import { FundingSourceSection } from './funding-source-section'
import { MissingRules } from './missing-rules'
import { ShareSummary } from './share-summary'

interface CostShareViewProps {
  design: DesignView
  /** Says why something is not worked out. */
  showNotReady: (result: PartFailed | PartWaiting) => ReactNode
  /** The way to choose funds, for who may. */
  chooseFunds: ReactNode
}

export function CostShareView({ design, showNotReady, chooseFunds }: CostShareViewProps) {
  const { cost, funding } = design.result
  const { costList, schedules, missing } = design.resolvedWith
  return (
    <>
      <MissingRules missing={missing} />
      <Section title="Who pays" aside={schedules.map(({ name }) => name).join(', ')}>
        <Box sx={{ maxWidth: 560, py: 2 }}>
          {cost.ok && funding.ok ? (
            <ShareSummary cost={cost.value} funding={funding.value} />
          ) : (
            !funding.ok && showNotReady(funding)
          )}
          {funding.ok && funding.value.sources.length === 0 && (
            <Typography sx={{ pt: 2 }}>
              No fund pays for this design, so the landowner pays all of it. {chooseFunds}
            </Typography>
          )}
        </Box>
      </Section>
      <Section title="Estimated cost" aside={costList && `Unit costs: ${costList.name}`}>
        {cost.ok ? (
          <>
            <CostTable cost={cost.value} />
            <Typography variant="body2" sx={{ color: 'text.secondary', pt: 2 }}>
              Each line is rounded to cents once; each total is the sum of the lines shown. Likely from{' '}
              {moneyText(cost.value.low)} to {moneyText(cost.value.high)}.
            </Typography>
          </>
        ) : (
          <Box sx={{ py: 2 }}>{showNotReady(cost)}</Box>
        )}
      </Section>
      {cost.ok &&
        funding.ok &&
        funding.value.sources.map((source) => (
          <FundingSourceSection key={source.key} source={source} cost={cost.value} />
        ))}
    </>
  )
}
