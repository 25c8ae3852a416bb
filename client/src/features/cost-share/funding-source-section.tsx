import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import { formatQuantity, moneyText, type CostEstimate, type FundedSource } from 'shared'
import { FigureCell, RuledTable, SumRow, type Column } from '../../components/layout/ruled-table'
import { Section } from '../../components/layout/section'
import { howItPays } from './source-words'

const rateColumn: Column = { key: 'rate', title: 'Rate', isFigure: true }

/** Only a fund that pays by the unit has rates. */
const columnsFor = (hasRates: boolean): Column[] => [
  { key: 'line', title: 'Eligible line' },
  { key: 'quantity', title: 'Quantity', isFigure: true },
  ...(hasRates ? [rateColumn] : []),
  { key: 'amount', title: 'Pays', isFigure: true },
]

interface FundingSourceSectionProps {
  source: FundedSource
  /** Gives the lines their names and units. */
  cost: CostEstimate
}

/** One fund: what it offered, what was cut and why, and the lines that sum to what it pays. */
export function FundingSourceSection({ source, cost }: FundingSourceSectionProps) {
  const hasRates = source.kind === 'unit-rate'
  const columns = columnsFor(hasRates)
  return (
    <Section title={source.name} aside={howItPays(source)}>
      <RuledTable caption={`Lines of ${source.name}`} columns={columns} minWidth={hasRates ? 480 : undefined}>
        {source.lines.map((line) => {
          const priced = cost.lines.find(({ key }) => key === line.key)
          return (
            <TableRow key={line.key}>
              <TableCell component="th" scope="row">
                {priced?.description ?? line.key}
              </TableCell>
              <FigureCell>{formatQuantity(line.quantityUsed, priced?.unit ?? '')}</FigureCell>
              {hasRates && <FigureCell>{line.rate === undefined ? '' : moneyText(line.rate)}</FigureCell>}
              <FigureCell>{moneyText(line.amount)}</FigureCell>
            </TableRow>
          )
        })}
        <SumRow>
          <TableCell component="th" scope="row" colSpan={columns.length - 1}>
            Pays
          </TableCell>
          <FigureCell isStrong>{moneyText(source.paid)}</FigureCell>
        </SumRow>
      </RuledTable>
      <Cuts source={source} />
      {source.advance !== '0.00' && (
        <Typography variant="body2">Of this, {moneyText(source.advance)} may be paid in advance.</Typography>
      )}
    </Section>
  )
}

/** The amounts above are after the cuts, so each cut is told with what it took. */
function Cuts({ source }: Pick<FundingSourceSectionProps, 'source'>) {
  if (source.cuts.length === 0) return null
  return (
    <>
      <Typography sx={{ pt: 2 }}>
        It would have paid {moneyText(source.offered)}. The lines above are after these cuts:
      </Typography>
      <ul>
        {source.cuts.map(({ reason, amount }) => (
          <li key={reason}>
            {moneyText(`-${amount}`)}, {reason}
          </li>
        ))}
      </ul>
    </>
  )
}
