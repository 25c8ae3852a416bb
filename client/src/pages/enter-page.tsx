import { useTranslation } from 'react-i18next'
import { useLocation, useNavigate } from 'react-router-dom'
import { Page } from '../components/layout/page'
import { EnterWithCode } from '../features/accounts/enter-with-code'

/** The secret stands behind the # so that it never reaches a server's log. */
export function EnterPage() {
  const { t } = useTranslation()
  const { hash } = useLocation()
  const navigate = useNavigate()
  const token = new URLSearchParams(hash.slice(1)).get('t') ?? ''
  return (
    <Page title={t('enter.title')}>
      <EnterWithCode
        token={token}
        onEntered={(session) =>
          void navigate(session.jobId ? `/my/${session.jobId}` : '/', { replace: true })
        }
      />
    </Page>
  )
}
