import { useQuery } from '@tanstack/react-query'
import { useNavigate } from 'react-router-dom'
import { costListsQuery } from '../api/districts'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { NewCostListForm } from '../features/cost-lists/new-cost-list-form'

export function NewCostListPage() {
  const navigate = useNavigate()
  const query = useQuery(costListsQuery)
  return (
    <Page title="New list of unit costs" maxWidth={1080}>
      <QueryGate query={query}>
        {(lists) => (
          <NewCostListForm
            inForce={lists.find(({ status }) => status === 'in-force')}
            onMade={() => void navigate('/cost-lists')}
          />
        )}
      </QueryGate>
    </Page>
  )
}
