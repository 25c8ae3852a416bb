import Box from '@mui/material/Box'
import { useQuery } from '@tanstack/react-query'
import type { DesignPart, DesignView } from 'shared'
import { calculateQuery } from '../../api/designs'
import { StatusLine } from '../../components/feedback/status-line'
import { SubmitButton } from '../../components/fields/submit-button'
import { useDebounced } from '../../components/layout/use-debounced'
import { PartEditor } from './part-editor'
import { PartNav } from './part-nav'
import type { PartSpec, StartFacts } from './part-spec'
import { PartSteps } from './part-steps'
import type { PlanDraft, Savable } from './plan-draft'
import { ResultSide } from './result-side'

interface DesignBodyProps {
  base: DesignView
  spec: PartSpec
  designPath: string
  facts: StartFacts
  draft: PlanDraft
  savable: Savable
  changed: readonly DesignPart[]
  isLocked: boolean
  told: string | null
}

const WAIT_MS = 400
const columns = { xs: '100%', lg: 'minmax(0, 2fr) minmax(300px, 1fr)' }

/** Parts on top, the form of one at left, what follows from it at right. */
export function DesignBody(props: DesignBodyProps) {
  const { base, spec, designPath, facts, draft, savable, changed, isLocked, told } = props
  const plan = useDebounced(savable.plan, WAIT_MS)
  const query = useQuery({ ...calculateQuery(base.jobId, plan), enabled: !isLocked })
  const { result, resolvedWith } = query.data ?? base
  return (
    <>
      <PartNav
        part={spec.part}
        designPath={designPath}
        draft={draft}
        unfinished={savable.unfinished}
        changed={changed}
        result={result}
      />
      <Box sx={{ display: 'grid', gridTemplateColumns: columns, columnGap: 8 }}>
        <Box sx={{ minWidth: 0 }}>
          <Box component="fieldset" disabled={isLocked} sx={{ border: 0, m: 0, p: 0, minWidth: 0 }}>
            <PartEditor spec={spec} value={draft[spec.part]} facts={facts} />
          </Box>
          {!isLocked && (
            <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, alignItems: 'center', mt: 6 }}>
              <SubmitButton words="Save the design" busyWords="Saving…" />
              <StatusLine words={told} />
            </Box>
          )}
          <PartSteps part={spec.part} designPath={designPath} />
        </Box>
        <ResultSide
          spec={spec}
          designPath={designPath}
          result={result}
          resolvedWith={resolvedWith}
          isBegun={Boolean(draft[spec.part])}
          isBehind={savable.unfinished.includes(spec.part)}
          isWorking={query.isFetching}
          problem={query.error}
        />
      </Box>
    </>
  )
}
