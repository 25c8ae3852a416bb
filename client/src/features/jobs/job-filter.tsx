import Box from '@mui/material/Box'
import InputBase from '@mui/material/InputBase'
import NativeSelect from '@mui/material/NativeSelect'
import { jobStates, stateWords, type JobState } from 'shared'
import type { JobFilter } from '../../api/jobs'

interface JobFilterBarProps {
  filter: JobFilter
  onChange: (filter: JobFilter) => void
}

export function JobFilterBar({ filter, onChange }: JobFilterBarProps) {
  return (
    <Box role="search" sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, my: 4 }}>
      <Box sx={{ flex: '1 1 240px', maxWidth: 360 }}>
        <label htmlFor="find-job">Find a job, a person, a tract</label>
        <InputBase
          id="find-job"
          type="search"
          fullWidth
          value={filter.find ?? ''}
          onChange={(event) => onChange({ ...filter, find: event.target.value || undefined })}
        />
      </Box>
      <Box>
        <label htmlFor="state-of-job">State</label>
        <Box>
          <NativeSelect
            input={<InputBase />}
            inputProps={{ id: 'state-of-job' }}
            value={filter.state ?? ''}
            onChange={(event) => onChange({ ...filter, state: asState(event.target.value) })}
          >
            <option value="">all</option>
            {jobStates.map((state) => (
              <option key={state} value={state}>
                {stateWords[state]}
              </option>
            ))}
          </NativeSelect>
        </Box>
      </Box>
    </Box>
  )
}

export const asState = (text: string | null): JobState | undefined =>
  jobStates.find((state) => state === text)
