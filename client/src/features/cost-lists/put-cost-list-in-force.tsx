import Button from '@mui/material/Button'
import Dialog from '@mui/material/Dialog'
import DialogActions from '@mui/material/DialogActions'
import DialogContent from '@mui/material/DialogContent'
import Typography from '@mui/material/Typography'
import { useId, useState } from 'react'
import type { CostListView } from 'shared'
import { usePutCostListInForce } from '../../api/districts'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { unpricedQuantities } from './unpriced-quantities'

interface PutCostListInForceProps {
  list: CostListView
}

export function PutCostListInForce({ list }: PutCostListInForceProps) {
  const put = usePutCostListInForce(list.id)
  const [isAsking, setIsAsking] = useState(false)
  const titleId = useId()
  const unpriced = unpricedQuantities(list)
  const close = () => setIsAsking(false)
  return (
    <>
      <ActButton words={`Put ${list.name} in force`} isMain onAct={() => setIsAsking(true)} />
      <Dialog open={isAsking} onClose={close} aria-labelledby={titleId}>
        <DialogContent>
          <Typography variant="h2" id={titleId}>
            Put {list.name} in force?
          </Typography>
          <Typography sx={{ my: 3 }}>
            After this it can never be edited. Every design is priced with it from then on, in place of the
            list that is in force now; packets already made keep their prices.
          </Typography>
          {unpriced.length > 0 && (
            <Typography sx={{ color: 'warning.main', fontWeight: 600 }}>
              It has no price for: {unpriced.join('; ')}. A design that holds one of these cannot be priced.
            </Typography>
          )}
          <ProblemAlert error={put.error} />
        </DialogContent>
        <DialogActions>
          <Button onClick={close}>Not yet</Button>
          <Button
            variant="contained"
            color="primary"
            aria-disabled={put.isPending}
            onClick={() => {
              if (!put.isPending) put.mutate(undefined, { onSuccess: close })
            }}
          >
            {put.isPending ? 'Putting in force…' : 'Put in force for good'}
          </Button>
        </DialogActions>
      </Dialog>
    </>
  )
}
