import type { JobView } from 'shared'
import { Instant } from '../../components/layout/instant'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'

interface JobOverviewPlaceProps {
  job: JobView
}

const known = (text: string | undefined): string => text ?? 'not entered'

/** Whose job it is and where it lies. */
export function JobOverviewPlace({ job }: JobOverviewPlaceProps) {
  return (
    <FigureRows>
      {job.producers.map(({ id, name, farmName }) => (
        <FigureRow key={id} label="Producer" value={`${name}, ${farmName}`} />
      ))}
      <FigureRow label="Water" value={`${job.waterName}, ${job.body}`} />
      <FigureRow label="County" value={job.county} />
      <FigureRow label="Farm number" value={known(job.farmNumber)} />
      <FigureRow label="Tract number" value={known(job.tractNumber)} />
      <FigureRow label="Field number" value={known(job.fieldNumber)} />
      <FigureRow label="Legal description or place" value={known(job.legalDescription)} />
      <FigureRow label="Designer" value={job.designerName ?? 'nobody yet'} />
      <FigureRow label="Last change" value={<Instant at={job.updatedAt} />} />
    </FigureRows>
  )
}
