import { useQuery } from '@tanstack/react-query'
import { costListsQuery } from '../api/districts'
import { useMay } from '../api/session-context'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { CostListSections } from '../features/cost-lists/cost-list-sections'

export function CostListsPage() {
  const may = useMay()
  const query = useQuery(costListsQuery)
  const newList = may('schedule:write') && <LinkButton to="/cost-lists/new" words="New list" isMain />
  return (
    <Page title="Prices" beside="unit costs that designs are priced with" action={newList}>
      <QueryGate query={query}>
        {(lists) =>
          lists.length > 0 ? (
            <CostListSections lists={lists} />
          ) : (
            <EmptyState title="No list of unit costs yet" action={newList}>
              Designs are priced with the list that is in force: a low, a typical and a high cost for each
              quantity.
            </EmptyState>
          )
        }
      </QueryGate>
    </Page>
  )
}
