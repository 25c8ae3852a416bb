import { useQuery } from '@tanstack/react-query'
import { peopleQuery } from '../api/people'
import { useMay } from '../api/session-context'
import { QueryGate } from '../components/feedback/query-gate'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { PeopleTable } from '../features/people/people-table'

export function PeoplePage() {
  const may = useMay()
  const query = useQuery(peopleQuery)
  return (
    <Page
      title="People"
      action={may('people:write') && <LinkButton to="/people/new" words="New person" isMain />}
    >
      <QueryGate query={query}>{(people) => <PeopleTable people={people} />}</QueryGate>
    </Page>
  )
}
