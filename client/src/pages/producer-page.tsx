import { useQuery, useQueryClient } from '@tanstack/react-query'
import { useNavigate, useParams } from 'react-router-dom'
import { producerQuery } from '../api/people'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { TextLink } from '../components/layout/text-link'
import { ChangeProducerForm } from '../features/producers/change-producer-form'

/** One producer, to put right what the district knows. */
export function ProducerPage() {
  const { producerId = '' } = useParams()
  const navigate = useNavigate()
  const queries = useQueryClient()
  const query = useQuery({ ...producerQuery(producerId), refetchOnWindowFocus: false })
  return (
    <Page
      title={query.data?.view.name ?? 'Producer'}
      action={<TextLink to="/producers">All producers</TextLink>}
      maxWidth={960}
    >
      <QueryGate query={query} lines={5}>
        {(loaded) => (
          <ChangeProducerForm
            loaded={loaded}
            onSaved={({ name }) =>
              void navigate(`/producers?${new URLSearchParams({ find: name }).toString()}`)
            }
            onReload={() => void queries.resetQueries({ queryKey: producerQuery(producerId).queryKey })}
          />
        )}
      </QueryGate>
    </Page>
  )
}
