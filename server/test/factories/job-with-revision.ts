import { randomUUID } from 'node:crypto'
import { northPondRows } from '../../../shared/examples/north-pond-design'
import { Design } from '../../src/designs/design.entity'
import { Revision } from '../../src/designs/revision.entity'
import { JobProducer } from '../../src/jobs/job-producer.entity'
import { Job } from '../../src/jobs/job.entity'
import { Producer } from '../../src/producers/producer.entity'
import type { Tx } from '../../src/platform/database/tx'
import { northPondSource } from '../packets/north-pond-source'

const { plan, result } = northPondSource()

interface JobToMake {
  designerId: string
  /** Persons who own the land and sign. */
  signers: { personId: string; name: string; email: string }[]
}

/** A draft job whose design is worked out and chosen, as the planner leaves it before making a packet. */
export async function makeJob(tx: Tx, { designerId, signers }: JobToMake): Promise<Job> {
  const { districtId, at, manager } = tx
  const [id, designId] = [randomUUID(), randomUUID()]
  const job = manager.create(Job, {
    districtId,
    id,
    number: `T-${id.slice(0, 8)}`,
    title: 'Marchbank, north pond',
    state: 'draft',
    version: 1,
    body: 'pond',
    waterName: 'North pond',
    county: 'Sable',
    farmNumber: null,
    tractNumber: null,
    fieldNumber: null,
    legalDescription: null,
    chosenDesignId: null,
    packetId: null,
    finalPacketId: null,
    createdBy: designerId,
    createdAt: at,
    updatedAt: at,
    stateSince: at,
  })
  await manager.insert(Job, job)
  await manager.insert(Design, {
    districtId,
    id: designId,
    jobId: id,
    name: 'First design',
    plan,
    result,
    resolvedWith: { criteriaSet: null, costList: null, schedules: [], missing: [] },
    calculationVersion: result.calculationVersion,
    designerId,
    createdAt: at,
    updatedAt: at,
  })
  await manager.update(Job, { districtId, id }, { chosenDesignId: designId })
  for (const [position, signer] of signers.entries()) await addSigner(tx, { jobId: id, position, signer })
  return manager.findOneByOrFail(Job, { districtId, id })
}

async function addSigner(
  { manager, districtId, at }: Tx,
  { jobId, position, signer }: { jobId: string; position: number; signer: JobToMake['signers'][number] },
): Promise<void> {
  const producerId = randomUUID()
  const { personId, name, email } = signer
  await manager.insert(Producer, {
    districtId,
    id: producerId,
    personId,
    name,
    farmName: `${name} farm`,
    email,
    phone: null,
    address: null,
    createdAt: at,
    updatedAt: at,
  })
  await manager.insert(JobProducer, { districtId, jobId, producerId, position, isSigner: true })
}

/** What freezing the chosen design leaves behind, without the rules of a district that freezing asks for. */
export async function makeRevision(tx: Tx, job: Job, number: number): Promise<Revision> {
  const revision = tx.manager.create(Revision, {
    districtId: tx.districtId,
    id: randomUUID(),
    jobId: job.id,
    designId: job.chosenDesignId ?? '',
    designVersion: 1,
    number,
    survey: { kind: 'level-notes', startElevationFt: 100, rows: northPondRows },
    plan,
    result,
    calculationVersion: result.calculationVersion,
    criteriaSetId: null,
    costListId: null,
    scheduleIds: [],
    designerId: job.createdBy,
    madeBy: job.createdBy,
    madeAt: tx.at,
  })
  await tx.manager.insert(Revision, revision)
  return revision
}
