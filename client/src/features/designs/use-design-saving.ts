import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import type { DesignPlan, DesignView } from 'shared'
import { designsQuery, useSaveDesign } from '../../api/designs'
import { ProblemError } from '../../api/problem-error'

interface Newer {
  sentence: string
  theirs: DesignView
}

const inBetween = (theirs: DesignView): Newer => ({
  sentence: `${theirs.designerName} saved version ${theirs.version} of “${theirs.name}”.`,
  theirs,
})

const newerOf = (error: Error | null): DesignView | null =>
  error instanceof ProblemError && error.slug === 'stale-version' ? (error.current as DesignView) : null

/** The version the page began with, saving on top of it, and what somebody else saved in between. */
export function useDesignSaving(jobId: string, latest: DesignView) {
  const queries = useQueryClient()
  const [base, setBase] = useState(latest)
  const save = useSaveDesign(jobId, latest.id)
  const refusedFor = newerOf(save.error)
  // While our own save is on its way the newest version may be ours.
  const newer = refusedFor ?? (latest.version > base.version && !save.isPending ? latest : null)

  return {
    base,
    isPending: save.isPending,
    problem: refusedFor === null ? save.error : null,
    newer: newer === null ? null : inBetween(newer),
    saveOver: async (plan: DesignPlan, on: DesignView): Promise<DesignView> => {
      const saved = await save.mutateAsync({ body: { name: on.name, plan }, version: on.version })
      setBase(saved)
      return saved
    },
    adopt: (theirs: DesignView) => {
      setBase(theirs)
      save.reset()
      void queries.invalidateQueries({ queryKey: designsQuery(jobId).queryKey, exact: true })
    },
  }
}
