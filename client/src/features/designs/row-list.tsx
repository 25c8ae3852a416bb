import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useState } from 'react'
import { get, useFieldArray, useFormContext, useFormState } from 'react-hook-form'
import { PartItems } from './part-items'
import type { ListSpec } from './part-spec'

interface RowListProps {
  name: string
  spec: ListSpec
}

interface TakenOut {
  index: number
  value: unknown
}

const fullRow = { borderBottom: 1, borderColor: 'divider', pt: 2, pb: 1 }
const compactRow = {
  ...fullRow,
  display: 'grid',
  gridTemplateColumns: { xs: '100%', md: '260px minmax(0, 1fr)' },
  alignItems: 'center',
  '& > div': { my: 1 },
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1)

/** Rows of the plan, each a small form; a row that was taken out can be put back. */
export function RowList({ name, spec }: RowListProps) {
  const { getValues } = useFormContext()
  const { fields, append, insert, remove, move } = useFieldArray({ name })
  const { errors } = useFormState({ name })
  const [takenOut, setTakenOut] = useState<TakenOut | null>(null)
  const error: unknown = get(errors, `${name}.root.message`) ?? get(errors, `${name}.message`)
  const one = capital(spec.one)

  const takeOut = (index: number) => {
    setTakenOut({ index, value: structuredClone(getValues(`${name}.${index}`)) as unknown })
    remove(index)
  }

  return (
    <Box component="section" aria-label={spec.title} sx={{ mt: 5 }}>
      <Typography variant="h3" sx={{ borderBottom: 1, borderColor: 'divider', pb: 1 }}>
        {spec.title}
      </Typography>
      {spec.hint && (
        <Typography variant="body2" sx={{ color: 'text.secondary', mt: 1 }}>
          {spec.hint}
        </Typography>
      )}
      {fields.map((row, index) => (
        <Box
          key={row.id}
          role="group"
          aria-label={`${one} ${index + 1}`}
          sx={spec.isCompact ? compactRow : fullRow}
        >
          <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', gap: 4 }}>
            <Typography sx={{ fontWeight: 600 }}>
              {one} {index + 1}
            </Typography>
            {spec.isOrdered && index > 0 && (
              <Button variant="text" onClick={() => move(index, index - 1)}>
                Move up<span className="visually-hidden"> {`${spec.one} ${index + 1}`}</span>
              </Button>
            )}
            <Button variant="text" onClick={() => takeOut(index)}>
              Take out<span className="visually-hidden"> {`${spec.one} ${index + 1}`}</span>
            </Button>
          </Box>
          <PartItems items={spec.items} under={`${name}.${index}`} column={spec.isCompact ? 150 : 184} />
        </Box>
      ))}
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, alignItems: 'center', mt: 2 }}>
        <Button onClick={() => append(structuredClone(spec.empty))}>Add a {spec.one}</Button>
        {takenOut && (
          <Button
            variant="text"
            onClick={() => {
              insert(takenOut.index, takenOut.value)
              setTakenOut(null)
            }}
          >
            Put the {spec.one} back
          </Button>
        )}
      </Box>
      {/* Under the button: it must not move away while it is pressed. */}
      {typeof error === 'string' && (
        <Typography variant="body2" sx={{ color: 'error.main', fontWeight: 600, mt: 2 }}>
          {error}
        </Typography>
      )}
    </Box>
  )
}
