import { useQuery } from '@tanstack/react-query'
import { producersQuery } from '../../api/people'
import { EmptyState } from '../../components/feedback/empty-state'
import { QueryGate } from '../../components/feedback/query-gate'
import { ProducerTable } from './producer-table'

interface ProducerListProps {
  find: string
}

export function ProducerList({ find }: ProducerListProps) {
  const query = useQuery(producersQuery(find))
  return (
    <QueryGate query={query} lines={8}>
      {(producers) => {
        if (producers.length > 0) return <ProducerTable producers={producers} />
        return find === '' ? (
          <EmptyState title="No producers yet">
            A producer is entered once, here or while a job is made, and then found by name.
          </EmptyState>
        ) : (
          <EmptyState title="No producer fits">Look for fewer letters of the name or the farm.</EmptyState>
        )
      }}
    </QueryGate>
  )
}
