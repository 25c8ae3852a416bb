import Box from '@mui/material/Box'
import { useQuery } from '@tanstack/react-query'
import type { JobView, ProducerView } from 'shared'
import { producersQuery } from '../../api/people'
import { QueryGate } from '../../components/feedback/query-gate'

interface AddresseesProps {
  producers: JobView['producers']
}

/** To whom the packet goes, and where that is. */
export function Addressees({ producers }: AddresseesProps) {
  return (
    <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0 }}>
      {producers.map((producer) => (
        <Box component="li" key={producer.id} sx={{ py: 2, borderBottom: 1, borderColor: 'divider' }}>
          <strong>{producer.name}</strong>, {producer.farmName}
          <Address producerId={producer.id} name={producer.name} />
        </Box>
      ))}
    </Box>
  )
}

/** A job names its producers only; their addresses are kept with the producers. */
function Address({ producerId, name }: { producerId: string; name: string }) {
  const query = useQuery(producersQuery(name))
  return (
    <QueryGate query={query} lines={1}>
      {(found) => (
        <Box sx={{ overflowWrap: 'anywhere' }}>{addressText(found.find(({ id }) => id === producerId))}</Box>
      )}
    </QueryGate>
  )
}

export function addressText(producer: ProducerView | undefined): string {
  if (producer?.email !== undefined) return producer.email
  if (producer?.address === undefined) {
    return 'No address is known, so nothing is sent. Enter one under Producers.'
  }
  const { street, town, region, postalCode } = producer.address
  return `No e-mail, so nothing is mailed. By post: ${street}, ${town}, ${region} ${postalCode}`
}
