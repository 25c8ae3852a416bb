import { useParams } from 'react-router-dom'
import { useMay } from '../api/session-context'
import { Page } from '../components/layout/page'
import { TextLink } from '../components/layout/text-link'
import { CostShareView } from '../features/cost-share/cost-share-view'
import { ChosenDesign } from '../features/figures/chosen-design'
import { planPlace } from '../features/figures/design-place'
import { NotReadyNote } from '../features/figures/not-ready-note'

export function CostSharePage() {
  const { jobId = '' } = useParams()
  const may = useMay()
  return (
    <Page title="Cost and funding">
      <ChosenDesign jobId={jobId}>
        {(design) => (
          <CostShareView
            design={design}
            showNotReady={(result) => <NotReadyNote design={design} result={result} />}
            chooseFunds={
              may('design:write') && (
                <TextLink to={planPlace(design, 'funding')}>Choose funds in the design</TextLink>
              )
            }
          />
        )}
      </ChosenDesign>
    </Page>
  )
}
