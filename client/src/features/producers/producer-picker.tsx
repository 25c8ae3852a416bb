import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import InputBase from '@mui/material/InputBase'
import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import type { ProducerView } from 'shared'
import { producersQuery } from '../../api/people'
import { QueryGate } from '../../components/feedback/query-gate'
import { fieldId } from '../../components/fields/field-id'
import { useDebounced } from '../../components/layout/use-debounced'
import { ProducerForm } from './producer-form'

interface ProducerPickerProps {
  chosen: readonly ProducerView[]
  onChange: (chosen: ProducerView[]) => void
}

const lineSx = {
  display: 'flex',
  gap: 4,
  alignItems: 'center',
  borderBottom: 1,
  borderColor: 'divider',
  py: 2,
}

/** Finds a producer who is known, or makes a new one, without leaving the job. */
export function ProducerPicker({ chosen, onChange }: ProducerPickerProps) {
  const [isMaking, setIsMaking] = useState(false)
  const add = (producer: ProducerView) => {
    onChange([...chosen.filter((one) => one.id !== producer.id), producer])
    setIsMaking(false)
  }
  return (
    <Box>
      {chosen.map((producer) => (
        <Box key={producer.id} sx={lineSx}>
          <Box sx={{ flex: 1 }}>
            <strong>{producer.name}</strong>, {producer.farmName}
          </Box>
          <Button variant="text" onClick={() => onChange(chosen.filter((one) => one.id !== producer.id))}>
            Take {producer.name} off
          </Button>
        </Box>
      ))}
      <FindProducer chosen={chosen} onAdd={add} />
      {isMaking ? (
        <Box sx={{ borderLeft: 3, borderColor: 'primary.main', pl: 4, my: 4 }}>
          <ProducerForm onAdded={add} isQuiet />
        </Box>
      ) : (
        <Button variant="text" onClick={() => setIsMaking(true)}>
          The producer is new here
        </Button>
      )}
    </Box>
  )
}

interface FindProducerProps {
  chosen: readonly ProducerView[]
  onAdd: (producer: ProducerView) => void
}

function FindProducer({ chosen, onAdd }: FindProducerProps) {
  const [find, setFind] = useState('')
  const query = useQuery(producersQuery(useDebounced(find, 300)))
  const id = fieldId('producerIds')
  return (
    <Box sx={{ my: 4 }}>
      <Box component="label" htmlFor={id} sx={{ fontWeight: 600 }}>
        Find a producer
      </Box>
      <Box>
        <InputBase
          id={id}
          type="search"
          value={find}
          onChange={(event) => setFind(event.target.value)}
          sx={{ width: '100%', maxWidth: 360 }}
        />
      </Box>
      <QueryGate query={query} lines={3}>
        {(producers) => {
          const others = producers.filter((one) => !chosen.some((taken) => taken.id === one.id)).slice(0, 6)
          return (
            <Box aria-live="polite">
              {others.length === 0 && <p>Nobody else by that name.</p>}
              {others.map((producer) => (
                <Box key={producer.id} sx={lineSx}>
                  <Box sx={{ flex: 1 }}>
                    {producer.name}, {producer.farmName}
                  </Box>
                  <Button onClick={() => onAdd(producer)}>Choose {producer.name}</Button>
                </Box>
              ))}
            </Box>
          )
        }}
      </QueryGate>
    </Box>
  )
}
