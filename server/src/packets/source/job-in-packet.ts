import type { Job } from '../../jobs/job.entity.js'
import type { PacketSource } from '../document/packet-source.js'

/** What a packet tells of its job; a field nobody filled in is left out. */
export function jobInPacket(job: Job): PacketSource['job'] {
  const { number, title, body, waterName, county } = job
  const { farmNumber, tractNumber, fieldNumber, legalDescription } = job
  return {
    number,
    title,
    body,
    waterName,
    county,
    ...(farmNumber === null ? {} : { farmNumber }),
    ...(tractNumber === null ? {} : { tractNumber }),
    ...(fieldNumber === null ? {} : { fieldNumber }),
    ...(legalDescription === null ? {} : { legalDescription }),
  }
}
