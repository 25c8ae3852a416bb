import { useQuery } from '@tanstack/react-query'
import { sessionsQuery } from '../api/session'
import { useSession } from '../api/session-context'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { ChangePasswordForm } from '../features/accounts/change-password-form'
import { DistrictChoice } from '../features/accounts/district-choice'
import { SessionTable } from '../features/accounts/session-table'
import { SignOutButton } from '../features/accounts/sign-out-button'

export function AccountPage() {
  const { name, email } = useSession()
  const query = useQuery(sessionsQuery)
  return (
    <Page title={name} beside={email} action={<SignOutButton />} maxWidth={960}>
      <DistrictChoice />
      <Section title="Password">
        <ChangePasswordForm />
      </Section>
      <Section title="Where you are signed in">
        <QueryGate query={query} lines={2}>
          {(sessions) => <SessionTable sessions={sessions} />}
        </QueryGate>
      </Section>
    </Page>
  )
}
