import { useQuery } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import type { DesignView } from 'shared'
import { designsQuery } from '../../api/designs'
import { EmptyState } from '../../components/feedback/empty-state'
import { QueryGate } from '../../components/feedback/query-gate'
import { LinkButton } from '../../components/layout/link-button'

interface ChosenDesignProps {
  jobId: string
  children: (design: DesignView) => ReactNode
}

/** The one design of a job that figures, checks, cost and packet speak of. */
export function ChosenDesign({ jobId, children }: ChosenDesignProps) {
  const query = useQuery(designsQuery(jobId))
  return (
    <QueryGate query={query} lines={10}>
      {(designs) => {
        const chosen = designs.find((design) => design.isChosen)
        if (chosen) return children(chosen)
        return (
          <EmptyState
            title="No design is chosen yet"
            action={<LinkButton to={`/jobs/${jobId}/design`} words="Go to the designs" isMain />}
          >
            Figures, checks, cost and packet follow the chosen design.
          </EmptyState>
        )
      }}
    </QueryGate>
  )
}
