import Button from '@mui/material/Button'
import type { ReactNode } from 'react'
import { useTranslation } from 'react-i18next'
import { LoadingLines } from '../../components/feedback/loading-lines'
import { LandownerProblem } from './landowner-problem'

interface LandownerGateProps<T> {
  query: { data: T | undefined; error: Error | null; refetch: () => unknown }
  children: (data: T) => ReactNode
}

/** What came, lines while it comes, or why it did not, in the language of the page. */
export function LandownerGate<T>({ query, children }: LandownerGateProps<T>) {
  const { t } = useTranslation()
  if (query.data !== undefined) return <>{children(query.data)}</>
  if (query.error === null) return <LoadingLines words={t('shell.loading')} />
  return (
    <LandownerProblem error={query.error}>
      <Button variant="text" onClick={() => void query.refetch()}>
        {t('shell.tryAgain')}
      </Button>
    </LandownerProblem>
  )
}
