import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useState } from 'react'
import { useFormContext, useWatch } from 'react-hook-form'
import { lengthSpecs, pointsSpec } from './fence-path-specs'
import { PartItems } from './part-items'
import { RowList } from './row-list'

interface FencePathProps {
  name: string
}

/** Where a run goes: by its points, or by its length alone. What was typed the other way comes back with a change. */
export function FencePath({ name }: FencePathProps) {
  const { getValues, setValue } = useFormContext()
  const path = useWatch({ name }) as { points?: unknown } | null | undefined
  const isDrawn = Array.isArray(path?.points)
  const [other, setOther] = useState<unknown>(isDrawn ? {} : { points: [{}, {}] })

  const change = () => {
    setOther(structuredClone(getValues(name)) as unknown)
    setValue(name, structuredClone(other))
  }

  return (
    <Box>
      {isDrawn ? (
        <RowList name={`${name}.points`} spec={pointsSpec} />
      ) : (
        <PartItems items={lengthSpecs} under={name} column={184} />
      )}
      <Button variant="text" onClick={change}>
        {isDrawn ? 'Give a length instead of points' : 'Give points instead of a length'}
      </Button>
    </Box>
  )
}
