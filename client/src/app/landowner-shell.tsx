import Button from '@mui/material/Button'
import { useQuery } from '@tanstack/react-query'
import { useSyncExternalStore } from 'react'
import { useTranslation } from 'react-i18next'
import { Outlet, ScrollRestoration } from 'react-router-dom'
import { sessionQuery, useSignOut } from '../api/session'
import { SessionContext } from '../api/session-context'
import { sessionExpired } from '../api/session-expired'
import { QueryGate } from '../components/feedback/query-gate'
import { DemoBand } from './demo-band'
import { LanguageButton } from './language-button'
import { MainArea } from './main-area'
import { SignedOutNotice } from './signed-out-notice'
import { SkipLink } from './skip-link'
import { TopBar } from './top-bar'

/** Around the landowner's pages: nothing of the district's own work is reachable from here. */
export function LandownerShell() {
  const { t } = useTranslation()
  const query = useQuery(sessionQuery)
  const signOut = useSignOut()
  const isExpired = useSyncExternalStore(sessionExpired.subscribe, sessionExpired.read)
  return (
    <>
      <SkipLink words={t('shell.skip')} />
      <TopBar>
        <LanguageButton />
        {query.data && (
          <Button variant="text" onClick={() => signOut.mutate()}>
            {t('shell.signOut')}
          </Button>
        )}
      </TopBar>
      {query.data?.district.isDemo && <DemoBand words={t('shell.demo')} />}
      <MainArea>
        {isExpired && <SignedOutNotice />}
        <QueryGate query={query}>
          {(session) =>
            session === null ? (
              <SignedOutNotice />
            ) : (
              <SessionContext value={session}>
                <Outlet />
              </SessionContext>
            )
          }
        </QueryGate>
      </MainArea>
      <ScrollRestoration />
    </>
  )
}
