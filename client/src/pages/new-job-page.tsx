import { useMemo, useState } from 'react'
import { useNavigate } from 'react-router-dom'
import type { ProducerView } from 'shared'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { NewJobForm } from '../features/jobs/new-job-form'
import { ProducerPicker } from '../features/producers/producer-picker'

export function NewJobPage() {
  const navigate = useNavigate()
  const [producers, setProducers] = useState<ProducerView[]>([])
  const producerIds = useMemo(() => producers.map((producer) => producer.id), [producers])
  return (
    <Page title="New job" maxWidth={960}>
      <Section title="Whose it is">
        <ProducerPicker chosen={producers} onChange={setProducers} />
      </Section>
      <Section title="Where it is">
        <NewJobForm producerIds={producerIds} onMade={(job) => void navigate(`/jobs/${job.id}`)} />
      </Section>
    </Page>
  )
}
