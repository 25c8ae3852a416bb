import { Injectable } from '@nestjs/common'
import { Revision } from '../../designs/revision.entity.js'
import { District } from '../../districts/district.entity.js'
import { JobAccessService } from '../../jobs/job-access.service.js'
import type { Tx } from '../../platform/database/tx.js'
import { SurveysService } from '../../surveys/surveys.service.js'
import type { PacketProducer, PacketSource } from '../document/packet-source.js'
import type { Packet } from '../packet.entity.js'
import { jobInPacket } from './job-in-packet.js'
import { packetPeopleQuery, type PacketPeopleRow } from './packet-people-query.js'
import { packetRulesQuery, type PacketRulesRow } from './packet-rules-query.js'

/** Gathers all that packet A shows, from the frozen revision. */
@Injectable()
export class PacketSourceService {
  constructor(
    private readonly jobs: JobAccessService,
    private readonly surveys: SurveysService,
  ) {}

  async gather(tx: Tx, { revisionId, jobId }: Packet): Promise<PacketSource> {
    const { manager, districtId } = tx
    const revision = await manager.findOneByOrFail(Revision, { districtId, id: revisionId })
    const district = await manager.findOneByOrFail(District, { id: districtId })
    const job = await this.jobs.load(tx, jobId, 'to-read')
    const people = one<PacketPeopleRow>(await manager.query(packetPeopleQuery, [districtId, revisionId]))
    const rules = one<PacketRulesRow>(await manager.query(packetRulesQuery, [districtId, revisionId]))
    return {
      // A district keeps no address yet.
      district: {
        name: district.name,
        addressLines: [],
        timeZone: district.timeZone,
        isDemo: district.isDemo,
      },
      job: jobInPacket(job),
      producers: people.producers.map(producerInPacket),
      designerName: people.designerName,
      revision: revision.number,
      madeAt: revision.madeAt.toISOString(),
      survey: { survey: revision.survey, ...this.surveys.reduce(revision.survey) },
      plan: revision.plan,
      result: revision.result,
      ...rules,
      variances: people.variances,
    }
  }
}

function producerInPacket({ name, farmName, address }: PacketPeopleRow['producers'][number]): PacketProducer {
  if (!address) return { name, farmName, addressLines: [] }
  const { street, town, region, postalCode } = address
  return { name, farmName, addressLines: [street, `${town}, ${region} ${postalCode}`] }
}

function one<Row>(rows: readonly Row[]): Row {
  const [row] = rows
  if (row === undefined) throw new Error('The revision of a packet went away while it was read.')
  return row
}
