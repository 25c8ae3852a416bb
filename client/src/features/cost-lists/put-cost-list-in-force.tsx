import Typography from '@mui/material/Typography'
import type { CostListView } from 'shared'
import { usePutCostListInForce } from '../../api/districts'
import { InForceButton } from '../../components/feedback/in-force-button'
import { unpricedQuantities } from './unpriced-quantities'

interface PutCostListInForceProps {
  list: CostListView
}

export function PutCostListInForce({ list }: PutCostListInForceProps) {
  const put = usePutCostListInForce(list.id)
  const unpriced = unpricedQuantities(list)
  return (
    <InForceButton words={`Put ${list.name} in force`} name={list.name} put={put}>
      <Typography sx={{ my: 3 }}>
        After this it can never be edited. Every design is priced with it from then on, in place of the list
        that is in force now; packets already made keep their prices.
      </Typography>
      {unpriced.length > 0 && (
        <Typography sx={{ color: 'warning.main', fontWeight: 600 }}>
          It has no price for: {unpriced.join('; ')}. A design that holds one of these cannot be priced.
        </Typography>
      )}
    </InForceButton>
  )
}
