import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useFormContext, useWatch } from 'react-hook-form'
import { PartItems } from './part-items'
import type { GroupSpec } from './part-spec'

interface OptionalGroupProps {
  name: string
  spec: GroupSpec
}

/** Fields that come and go together. */
export function OptionalGroup({ name, spec }: OptionalGroupProps) {
  const { setValue } = useFormContext()
  const value: unknown = useWatch({ name })
  const isThere = value !== undefined && value !== null
  return (
    <Box component="section" aria-label={spec.title} sx={{ mt: 5 }}>
      <Typography variant="h3" sx={{ borderBottom: 1, borderColor: 'divider', pb: 1 }}>
        {spec.title}
      </Typography>
      <Typography variant="body2" sx={{ color: 'text.secondary', my: 2 }}>
        {spec.hint}
      </Typography>
      {isThere ? (
        <>
          <PartItems items={spec.items} under={name} column={184} />
          <Button variant="text" onClick={() => setValue(name, null)}>
            Do without: {spec.title.toLowerCase()}
          </Button>
        </>
      ) : (
        <Button onClick={() => setValue(name, structuredClone(spec.empty))}>
          Add: {spec.title.toLowerCase()}
        </Button>
      )}
    </Box>
  )
}
