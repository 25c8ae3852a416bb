import Box from '@mui/material/Box'
import { useMemo } from 'react'
import { StatusLine } from '../../components/feedback/status-line'
import { SubmitButton } from '../../components/fields/submit-button'
import { reduceSoFar } from './reduce-so-far'
import { readSurvey, type SurveyDraft } from './survey-draft'
import { SurveyFields } from './survey-fields'
import { SurveySide } from './survey-side'

interface SurveyBodyProps {
  draft: SurveyDraft
  isLocked: boolean
  told: string | null
}

const columns = { xs: '100%', lg: 'minmax(0, 5fr) minmax(280px, 2fr)' }

export function SurveyBody({ draft, isLocked, told }: SurveyBodyProps) {
  const soFar = useMemo(() => reduceSoFar(readSurvey(draft)), [draft])
  return (
    <>
      <Box sx={{ display: 'grid', gridTemplateColumns: columns, columnGap: 8 }}>
        <Box
          component="fieldset"
          disabled={isLocked}
          sx={{ border: 0, m: 0, p: 0, minWidth: 0, '&:disabled button': { visibility: 'hidden' } }}
        >
          <SurveyFields kind={draft.kind} soFar={soFar} />
        </Box>
        <SurveySide soFar={soFar} />
      </Box>
      {!isLocked && (
        <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, alignItems: 'center', mt: 6 }}>
          <SubmitButton words="Save the survey" busyWords="Saving…" />
          <StatusLine words={told} />
        </Box>
      )}
    </>
  )
}
