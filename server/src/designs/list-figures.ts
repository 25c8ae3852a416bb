import type { DesignPlan, DesignResult, Money } from 'shared'

/** What the table of jobs shows of the chosen design. */
export interface ListFigures {
  gradeRunPerRise: number | null
  stoneOrderTons: number | null
  landownerShare: Money | null
}

export const noListFigures: ListFigures = {
  gradeRunPerRise: null,
  stoneOrderTons: null,
  landownerShare: null,
}

export function listFigures({ plan, result }: { plan: DesignPlan; result: DesignResult }): ListFigures {
  return {
    gradeRunPerRise: plan.ramp?.gradeRunPerRise ?? null,
    stoneOrderTons: result.rock.ok ? result.rock.value.totalOrderTons : null,
    landownerShare: result.funding.ok ? result.funding.value.landownerShare : null,
  }
}
