import Box from '@mui/material/Box'
import { useEffect, useMemo, useRef, type ReactNode } from 'react'
import { FormProvider, type FieldValues, type Path, type UseFormReturn } from 'react-hook-form'
import { ProblemError } from '../../api/problem-error'
import { ErrorSummary } from '../feedback/error-summary'
import { ProblemAlert } from '../feedback/problem-alert'
import { FormLabels } from './form-labels'
import { flatErrors } from './flat-errors'
import { pointerPath } from './pointer-path'

interface FormProps<In extends FieldValues, Out> {
  form: UseFormReturn<In, unknown, Out>
  onSubmit: (values: Out) => Promise<unknown> | void
  /** What the server answered to the last try. */
  problem?: Error | null
  /** Where in the request body the fields of this form lie, such as /plan. */
  pointerUnder?: string
  label?: string
  children: ReactNode
}

/** A form whose errors, ours and the server's, are listed on top with focus and stand beside their fields. */
export function Form<In extends FieldValues, Out>(props: FormProps<In, Out>) {
  const { form, onSubmit, problem = null, pointerUnder = '', label, children } = props
  const labels = useMemo(() => new Map<string, string>(), [])
  const summary = useRef<HTMLDivElement>(null)
  const { errors, submitCount, isSubmitting, isSubmitSuccessful } = form.formState
  const flat = flatErrors(errors)
  // What is typed after a save went well is not yet an error to be led to.
  const hasFailed = submitCount > 0 && (!isSubmitSuccessful || problem !== null)
  const { setError } = form

  useEffect(() => {
    if (!(problem instanceof ProblemError)) return
    for (const { pointer, message } of problem.fields) {
      const path = pointerPath(pointer, pointerUnder)
      if (path) setError(path as Path<In>, { type: 'server', message })
    }
  }, [problem, pointerUnder, setError])

  useEffect(() => {
    if (submitCount > 0 && !isSubmitting) summary.current?.focus()
  }, [submitCount, isSubmitting, problem])

  return (
    <FormLabels.Provider value={labels}>
      <FormProvider {...form}>
        <Box
          component="form"
          noValidate
          aria-label={label}
          onSubmit={(event: React.FormEvent) => {
            event.preventDefault()
            event.stopPropagation()
            if (isSubmitting) return
            void form.handleSubmit(async (values) => {
              // A refusal is shown from `problem`; it must not become an unhandled rejection.
              await Promise.resolve(onSubmit(values)).catch(() => undefined)
            })()
          }}
        >
          {hasFailed && flat.length > 0 ? (
            <ErrorSummary ref={summary} errors={flat} labels={labels} />
          ) : (
            <ProblemAlert error={problem} ref={summary} />
          )}
          {children}
        </Box>
      </FormProvider>
    </FormLabels.Provider>
  )
}
