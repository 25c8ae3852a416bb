import { useState } from 'react'
import { useWatch } from 'react-hook-form'
import type { SurveyInput, SurveyView } from 'shared'
import { LeaveGuard } from '../../components/feedback/leave-guard'
import { StaleChoice } from '../../components/feedback/stale-choice'
import { Form } from '../../components/fields/form'
import { useFilledForm } from '../../components/fields/use-filled-form'
import { SurveyBody } from './survey-body'
import { isSurveyChanged, surveyDifferences } from './survey-differences'
import { surveyDraft, type SurveyDraft } from './survey-draft'
import { surveyFormSchema } from './survey-form-schema'
import { useSurveySaving } from './use-survey-saving'

interface SurveyFormProps {
  jobId: string
  loaded: SurveyView | null
  /** Why it cannot be changed; null when it can. */
  lock: string | null
}

/** The survey of a job: typed at left, worked out at right as one types. */
export function SurveyForm({ jobId, loaded, lock }: SurveyFormProps) {
  const saving = useSurveySaving(jobId, loaded)
  const [told, setTold] = useState<string | null>(null)
  const { form, fill } = useFilledForm(surveyFormSchema, surveyDraft(loaded?.survey ?? null))
  const draft = useWatch({ control: form.control }) as Partial<SurveyDraft>
  const { base, stale } = saving
  const isFilled = isWhole(draft)
  const hasUnsaved = isFilled && lock === null && isSurveyChanged(draft, base?.survey ?? null)

  const save = async (survey: SurveyInput, version: number) => {
    setTold(null)
    await saving.saveOver(survey, version)
    setTold(`Saved as version ${version + 1}.`)
  }

  return (
    <Form
      form={form}
      problem={saving.problem}
      label="Survey"
      onSubmit={(survey) => save(survey, base?.version ?? 0)}
    >
      <LeaveGuard hasUnsaved={hasUnsaved} />
      {stale && isFilled && (
        <StaleChoice
          sentence={stale.sentence}
          differences={surveyDifferences(draft, stale.theirs?.survey ?? null)}
          isBusy={saving.isPending}
          onKeepMine={() => {
            const send = form.handleSubmit((survey) => save(survey, stale.theirs?.version ?? 0))
            // A refusal is shown from `saving`; it must not become an unhandled rejection.
            void send().catch(() => undefined)
          }}
          onTakeTheirs={() => {
            saving.takeTheirs()
            fill(surveyDraft(stale.theirs?.survey ?? null))
          }}
        />
      )}
      {isFilled && <SurveyBody draft={draft} isLocked={lock !== null} told={hasUnsaved ? null : told} />}
    </Form>
  )
}

/** Before the form is filled there is nothing to show. */
const isWhole = (draft: Partial<SurveyDraft>): draft is SurveyDraft => draft.kind !== undefined
