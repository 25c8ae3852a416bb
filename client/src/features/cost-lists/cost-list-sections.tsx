import Box from '@mui/material/Box'
import { formatCivilDate, versionedStatuses, type CostListView } from 'shared'
import { useMay } from '../../api/session-context'
import { Section } from '../../components/layout/section'
import { CostListPrices } from './cost-list-prices'
import { PutCostListInForce } from './put-cost-list-in-force'

interface CostListSectionsProps {
  lists: readonly CostListView[]
}

/** Drafts first, then what is in force, then what was: one is open, the others open at a press. */
export function CostListSections({ lists }: CostListSectionsProps) {
  const may = useMay()
  const sorted = versionedStatuses.flatMap((status) => lists.filter((list) => list.status === status))
  return sorted.map((list) => (
    <Section
      key={list.id}
      title={list.name}
      aside={`${list.status.replace('-', ' ')}, good from ${formatCivilDate(list.effectiveFrom)}`}
    >
      <p>Where the prices come from: {list.source}.</p>
      {list.status === 'draft' && may('schedule:write') && (
        <Box sx={{ my: 3 }}>
          <PutCostListInForce list={list} />
        </Box>
      )}
      <details open={list.status === 'in-force'}>
        <summary>Prices of {list.name}</summary>
        <CostListPrices list={list} />
      </details>
    </Section>
  ))
}
