import type { DesignView } from 'shared'
import type { Design } from './design.entity.js'
import { upgradePlan } from './upgrade-plan.js'

interface DesignViewParts {
  design: Design
  designerName: string
  chosenDesignId: string | null
}

export function designView({ design, designerName, chosenDesignId }: DesignViewParts): DesignView {
  return {
    id: design.id,
    jobId: design.jobId,
    name: design.name,
    version: design.version,
    isChosen: design.id === chosenDesignId,
    plan: upgradePlan(design.plan),
    result: design.result,
    resolvedWith: design.resolvedWith,
    updatedAt: design.updatedAt.toISOString(),
    designerName,
  }
}
