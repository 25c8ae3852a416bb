import { useParams } from 'react-router-dom'
import { Page } from '../components/layout/page'
import { ChosenDesign } from '../features/figures/chosen-design'
import { FiguresView } from '../features/figures/figures-view'

export function FiguresPage() {
  const { jobId = '' } = useParams()
  return (
    <Page title="Figures" maxWidth={1100}>
      <ChosenDesign jobId={jobId}>{(design) => <FiguresView design={design} />}</ChosenDesign>
    </Page>
  )
}
