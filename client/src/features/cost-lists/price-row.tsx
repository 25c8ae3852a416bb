import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { quantityCatalogue, type QuantityKey } from 'shared'
import { RateField } from '../../components/fields/rate-field'
import { perUnit } from '../../components/layout/per-unit'

const prices = [
  { name: 'low', label: 'Low' },
  { name: 'typical', label: 'Typical' },
  { name: 'high', label: 'High' },
] as const

interface PriceRowProps {
  quantity: QuantityKey
  index: number
}

export function PriceRow({ quantity, index }: PriceRowProps) {
  const { description, unit } = quantityCatalogue[quantity]
  return (
    <TableRow>
      <TableCell component="th" scope="row" sx={{ verticalAlign: 'middle' }}>
        {description}
      </TableCell>
      {prices.map(({ name, label }) => (
        <TableCell key={name}>
          <RateField
            name={`lines.${index}.${name}`}
            label={`${label}, ${description.toLowerCase()}`}
            unit={`$ ${perUnit(unit)}`}
            isLabelHidden
          />
        </TableCell>
      ))}
    </TableRow>
  )
}
