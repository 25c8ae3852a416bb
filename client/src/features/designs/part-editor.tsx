import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useEffect, useRef, useState } from 'react'
import { useFormContext } from 'react-hook-form'
import { PartItems } from './part-items'
import type { PartSpec, StartFacts } from './part-spec'

interface PartEditorProps {
  spec: PartSpec
  value: unknown
  facts: StartFacts
}

/** The form of one part, or the way to begin it. A part that is left out can be put back as it was. */
export function PartEditor({ spec, value, facts }: PartEditorProps) {
  const { getValues, setValue } = useFormContext()
  const [leftOut, setLeftOut] = useState<Readonly<Record<string, unknown>>>({})
  const heading = useHeadingFocus(spec.part)
  const isBegun = value !== undefined && value !== null
  const before = leftOut[spec.part]

  const leaveOut = () => {
    setLeftOut({ ...leftOut, [spec.part]: structuredClone(getValues(spec.part)) as unknown })
    setValue(spec.part, null)
  }

  return (
    <Box component="section" aria-label={spec.title}>
      <Typography variant="h2" tabIndex={-1} ref={heading} sx={{ '&:focus': { outline: 'none' } }}>
        {spec.title}
      </Typography>
      <Typography sx={{ color: 'text.secondary', mt: 1 }}>{spec.sentence}</Typography>
      {isBegun ? (
        <Box key={spec.part}>
          <PartItems items={spec.items} under={spec.part} />
          <Button variant="text" sx={{ mt: 4 }} onClick={leaveOut}>
            Leave this part out
          </Button>
        </Box>
      ) : (
        <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, my: 6 }}>
          <Button
            variant="contained"
            color="primary"
            onClick={() => setValue(spec.part, structuredClone(spec.start(facts)))}
          >
            Start this part
          </Button>
          {before !== undefined && (
            <Button onClick={() => setValue(spec.part, structuredClone(before))}>
              Put it back as it was
            </Button>
          )}
        </Box>
      )}
    </Box>
  )
}

/** On the way to another part the focus goes to its heading, as it does from page to page. */
function useHeadingFocus(part: string) {
  const heading = useRef<HTMLHeadingElement>(null)
  const shown = useRef(part)
  useEffect(() => {
    if (shown.current === part) return
    shown.current = part
    heading.current?.focus()
  }, [part])
  return heading
}
