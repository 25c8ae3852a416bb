import { useState } from 'react'
import { Page } from '../components/layout/page'
import { PasswordOnce } from '../features/people/password-once'
import { PersonForm, type AddedPerson } from '../features/people/person-form'

export function NewPersonPage() {
  const [added, setAdded] = useState<AddedPerson | null>(null)
  return added === null ? (
    <Page key="form" title="New person" maxWidth={960}>
      <PersonForm onAdded={setAdded} />
    </Page>
  ) : (
    <Page key="added" title={`${added.person.name} is added`} maxWidth={720}>
      <PasswordOnce added={added} />
    </Page>
  )
}
