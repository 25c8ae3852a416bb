import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useParams, useSearchParams } from 'react-router-dom'
import type { DesignView } from 'shared'
import { EmptyState } from '../components/feedback/empty-state'
import { Page } from '../components/layout/page'
import { asVerdict, CheckFilter } from '../features/checks/check-filter'
import { CheckList } from '../features/checks/check-list'
import { MissingRules } from '../features/cost-share/missing-rules'
import { ChosenDesign } from '../features/figures/chosen-design'

export function ChecksPage() {
  const { jobId = '' } = useParams()
  return (
    <Page title="Checks">
      <ChosenDesign jobId={jobId}>{(design) => <Checks design={design} />}</ChosenDesign>
    </Page>
  )
}

/** The filter lives in the address, so that Back and a sent link show the same lines. */
function Checks({ design }: { design: DesignView }) {
  const [query, setQuery] = useSearchParams()
  const shown = asVerdict(query.get('show'))
  const { checks } = design.result
  const { criteriaSet, missing } = design.resolvedWith
  if (checks.length === 0) {
    return (
      <>
        <EmptyState title="Nothing is checked yet">
          No criteria set is in force for this district. An administrator puts one in force.
        </EmptyState>
        <MissingRules missing={missing} />
      </>
    )
  }
  const listed = shown === null ? checks : checks.filter(({ verdict }) => verdict === shown)
  return (
    <>
      <Typography sx={{ color: 'text.secondary' }}>
        Design “{design.name}”{criteriaSet && `, held against ${criteriaSet.name}`}.
      </Typography>
      <Box sx={{ my: 4 }}>
        <CheckFilter
          checks={checks}
          shown={shown}
          onShow={(verdict) => setQuery(verdict === null ? {} : { show: verdict }, { replace: true })}
        />
      </Box>
      {listed.length === 0 ? <p role="status">None of these.</p> : <CheckList checks={listed} />}
      <MissingRules missing={missing} />
    </>
  )
}
