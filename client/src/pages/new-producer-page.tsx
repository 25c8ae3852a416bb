import { useNavigate } from 'react-router-dom'
import { Page } from '../components/layout/page'
import { ProducerForm } from '../features/producers/producer-form'

export function NewProducerPage() {
  const navigate = useNavigate()
  return (
    <Page title="New producer" maxWidth={960}>
      <ProducerForm
        onAdded={({ name }) => void navigate(`/producers?${new URLSearchParams({ find: name }).toString()}`)}
      />
    </Page>
  )
}
