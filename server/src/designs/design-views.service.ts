import { Injectable } from '@nestjs/common'
import { Problem, type DesignView } from 'shared'
import { Person } from '../accounts/person.entity.js'
import { JobAccessService, type Asking } from '../jobs/job-access.service.js'
import type { Tx } from '../platform/database/tx.js'
import { designView } from './design-view.js'
import { Design } from './design.entity.js'

/** Designs as the people of the district read them. */
@Injectable()
export class DesignViewsService {
  constructor(private readonly access: JobAccessService) {}

  /** The alternatives of a job, in the order in which they were begun. */
  async list(tx: Tx, asking: Asking, jobId: string): Promise<DesignView[]> {
    const { chosenDesignId } = await this.access.find(tx, asking, 'design:read', jobId, 'to-read')
    const designs = await tx.manager.find(Design, {
      where: { districtId: tx.districtId, jobId },
      order: { createdAt: 'ASC', id: 'ASC' },
    })
    return Promise.all(designs.map((design) => this.viewOf(tx, design, chosenDesignId)))
  }

  async read(tx: Tx, asking: Asking, designId: string): Promise<DesignView> {
    const design = await this.load(tx, designId)
    const { chosenDesignId } = await this.access.find(tx, asking, 'design:read', design.jobId, 'to-read')
    return this.viewOf(tx, design, chosenDesignId)
  }

  async load(tx: Tx, designId: string): Promise<Design> {
    const design = await tx.manager.findOneBy(Design, { districtId: tx.districtId, id: designId })
    if (design === null) throw new Problem('not-found')
    return design
  }

  async viewOf(tx: Tx, design: Design, chosenDesignId: string | null): Promise<DesignView> {
    const designer = await tx.manager.findOneBy(Person, { id: design.designerId })
    return designView({ design, designerName: designer?.name ?? 'a former colleague', chosenDesignId })
  }
}
