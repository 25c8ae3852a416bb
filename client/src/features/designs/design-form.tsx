import { useMemo, useState } from 'react'
import { useWatch } from 'react-hook-form'
import { useNavigate } from 'react-router-dom'
import type { DesignView } from 'shared'
import { LeaveGuard } from '../../components/feedback/leave-guard'
import { StaleChoice } from '../../components/feedback/stale-choice'
import { Form } from '../../components/fields/form'
import { useFilledForm } from '../../components/fields/use-filled-form'
import { DesignBody } from './design-body'
import { designDifferences } from './design-differences'
import { partSpec } from './part-catalogue'
import type { PartSpec, StartFacts } from './part-spec'
import { planDraft, savablePlan, type PlanDraft, type Savable } from './plan-draft'
import { planFormSchema } from './plan-form-schema'
import { refusedPart } from './refused-part'
import { changedParts, mergePlans } from './same-plan'
import { useDesignSaving } from './use-design-saving'

interface DesignFormProps {
  design: DesignView
  spec: PartSpec
  facts: StartFacts
  /** Why it cannot be changed; null when it can. */
  lock: string | null
}

const savedWords = (version: number, { unfinished }: Savable): string => {
  const titles = unfinished.map((part) => partSpec(part)?.title).join(', ')
  const rest = titles === '' ? '' : ` Not complete, so only on this page: ${titles}.`
  return `Saved as version ${version}.${rest}`
}

/** A whole design in one form, of which one part is on the page: going from part to part loses nothing. */
export function DesignForm({ design, spec, facts, lock }: DesignFormProps) {
  const navigate = useNavigate()
  const saving = useDesignSaving(design.jobId, design)
  const [told, setTold] = useState<string | null>(null)
  const { base, newer } = saving
  const schema = useMemo(() => planFormSchema(spec.part, base.plan), [spec.part, base.plan])
  const { form, fill } = useFilledForm(schema, planDraft(base.plan))
  const draft = useWatch({ control: form.control }) as PlanDraft
  const savable = useMemo(() => savablePlan(draft, base.plan), [draft, base.plan])
  const designPath = `/jobs/${design.jobId}/design/${design.id}`
  const isFilled = draft.inputVersion !== undefined
  const changed = isFilled ? changedParts(savable.plan, base.plan) : []
  const notSaved = [...new Set([...changed, ...savable.unfinished])]

  const save = async (typed: Savable, on: DesignView) => {
    setTold(null)
    try {
      const saved = await saving.saveOver(typed.plan, on)
      setTold(savedWords(saved.version, typed))
    } catch (error) {
      const part = refusedPart(error)
      if (part !== null && part !== spec.part) void navigate(`${designPath}/${part}`)
      throw error
    }
  }

  const keepMine = (theirs: DesignView) => {
    const plan = mergePlans(savable.plan, base.plan, theirs.plan)
    const unfinished = savable.unfinished.map((part) => [part, draft[part]] as const)
    fill({ ...planDraft(plan), ...structuredClone(Object.fromEntries(unfinished)) })
    // A refusal is shown from `saving`; it must not become an unhandled rejection.
    void save({ ...savable, plan }, theirs).catch(() => undefined)
  }

  return (
    <Form
      form={form}
      problem={saving.problem}
      pointerUnder="/plan"
      label={`${design.name}, ${spec.title.toLowerCase()}`}
      onSubmit={(typed) => save(typed, base)}
    >
      <LeaveGuard hasUnsaved={lock === null && notSaved.length > 0} within={`${designPath}/`} />
      {newer && lock === null && (
        <StaleChoice
          sentence={newer.sentence}
          differences={designDifferences(savable.plan, newer.theirs.plan)}
          isBusy={saving.isPending}
          onKeepMine={() => keepMine(newer.theirs)}
          onTakeTheirs={() => {
            saving.adopt(newer.theirs)
            fill(planDraft(newer.theirs.plan))
          }}
        />
      )}
      {isFilled && (
        <DesignBody
          base={base}
          spec={spec}
          designPath={designPath}
          facts={facts}
          draft={draft}
          savable={savable}
          changed={lock === null ? notSaved : []}
          isLocked={lock !== null}
          told={changed.length > 0 ? null : told}
        />
      )}
    </Form>
  )
}
