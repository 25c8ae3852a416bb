import { moneyText, type CostEstimate, type FundingResult } from 'shared'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'

interface ShareSummaryProps {
  cost: CostEstimate
  funding: FundingResult
}

/** From the estimated cost down to what is left to the landowner. */
export function ShareSummary({ cost, funding }: ShareSummaryProps) {
  return (
    <FigureRows>
      <FigureRow label="Estimated cost" value={moneyText(cost.typical)} />
      {funding.sources.map((source) => (
        <FigureRow
          key={source.key}
          label={`Paid by ${source.name}`}
          value={<span style={{ whiteSpace: 'nowrap' }}>{moneyText(`-${source.paid}`)}</span>}
        />
      ))}
      <FigureRow label="Landowner’s share" value={moneyText(funding.landownerShare)} isSum />
    </FigureRows>
  )
}
