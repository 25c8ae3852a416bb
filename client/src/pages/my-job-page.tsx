import { LandownerPage } from '../features/landowner/landowner-page'
import { MyJob } from '../features/landowner/my-job'
import { MyPacket } from '../features/landowner/my-packet'

export function MyJobPage() {
  return (
    <MyPacket>
      {(job, packet) => (
        <LandownerPage title={job.title}>
          <MyJob job={job} packet={packet} />
        </LandownerPage>
      )}
    </MyPacket>
  )
}
