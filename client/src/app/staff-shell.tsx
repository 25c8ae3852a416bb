import { useQuery } from '@tanstack/react-query'
import { Navigate, Outlet, ScrollRestoration, useLocation } from 'react-router-dom'
import { sessionQuery } from '../api/session'
import { SessionContext } from '../api/session-context'
import { QueryGate } from '../components/feedback/query-gate'
import { TextLink } from '../components/layout/text-link'
import { SignInAgain } from '../features/accounts/sign-in-again'
import { DemoBand } from './demo-band'
import { MainArea } from './main-area'
import { SkipLink } from './skip-link'
import { StaffNavigation } from './staff-navigation'
import { TopBar } from './top-bar'

/** Around every page of the district's people. */
export function StaffShell() {
  const query = useQuery(sessionQuery)
  const { pathname, search } = useLocation()
  return (
    <QueryGate query={query}>
      {(session) =>
        session === null ? (
          <Navigate to={`/sign-in?to=${encodeURIComponent(pathname + search)}`} replace />
        ) : (
          <SessionContext value={session}>
            <SkipLink words="Skip to the page" />
            <TopBar navigation={<StaffNavigation />}>
              <span>
                <TextLink to="/account" isStrong>
                  {session.name}
                </TextLink>{' '}
                {session.roles.join(', ')}, {session.district.name}
              </span>
            </TopBar>
            {session.district.isDemo && (
              <DemoBand words="Example data. Everything in this district is invented." />
            )}
            <MainArea>
              <Outlet />
            </MainArea>
            <SignInAgain email={session.email} />
            <ScrollRestoration />
          </SessionContext>
        )
      }
    </QueryGate>
  )
}
