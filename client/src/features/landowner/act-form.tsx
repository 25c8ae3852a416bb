import Box from '@mui/material/Box'
import type { ReactNode } from 'react'
import { FormProvider, type UseFormReturn } from 'react-hook-form'
import type { Act } from 'shared'
import { LandownerProblem } from './landowner-problem'
import type { ActFields } from './use-act-form'

interface ActFormProps {
  form: UseFormReturn<ActFields, unknown, Act>
  label: string
  onSubmit: () => void
  /** What the server answered to the last try. */
  problem: Error | null
  children: ReactNode
}

/** The frame of a landowner's form: one or two boxes, the first wrong one takes the focus. */
export function ActForm({ form, label, onSubmit, problem, children }: ActFormProps) {
  return (
    <FormProvider {...form}>
      <Box
        component="form"
        noValidate
        aria-label={label}
        onSubmit={(event: React.FormEvent) => {
          event.preventDefault()
          onSubmit()
        }}
      >
        <LandownerProblem error={problem} />
        {children}
      </Box>
    </FormProvider>
  )
}
