import { Injectable } from '@nestjs/common'
import type { Role } from 'shared'
import type { Tx } from '../../platform/database/tx.js'

export interface Recipient {
  personId: string
  name: string
  address: string
}

export interface ProducerRecipient {
  personId: string | null
  name: string
  address: string
}

const producersQuery = (only: string): string => `
  select p.person_id as "personId", p.name, p.email as address
  from job_producers jp
  join producers p on p.district_id = jp.district_id and p.id = jp.producer_id
  where jp.district_id = $1 and jp.job_id = $2 and p.email is not null ${only}
  order by jp.position
`

const peopleQuery = (only: string): string => `
  select o.id as "personId", o.name, o.email as address
  from people o
  join memberships m on m.person_id = o.id
  where m.district_id = $1 and m.is_active and o.is_active and ${only}
  order by o.email
`

/** To whom the letters of a job go. A producer's address is the one the office keeps with the producer. */
@Injectable()
export class RecipientsService {
  signers(tx: Tx, jobId: string): Promise<Recipient[]> {
    const only = 'and jp.is_signer and p.person_id is not null'
    return tx.manager.query(producersQuery(only), [tx.districtId, jobId])
  }

  producers(tx: Tx, jobId: string): Promise<ProducerRecipient[]> {
    return tx.manager.query(producersQuery(''), [tx.districtId, jobId])
  }

  withRole(tx: Tx, role: Role): Promise<Recipient[]> {
    return tx.manager.query(peopleQuery('$2 = any (m.roles)'), [tx.districtId, role])
  }

  person(tx: Tx, personId: string): Promise<Recipient[]> {
    return tx.manager.query(peopleQuery('o.id = $2'), [tx.districtId, personId])
  }
}
