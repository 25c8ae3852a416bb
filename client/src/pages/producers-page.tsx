import Box from '@mui/material/Box'
import InputBase from '@mui/material/InputBase'
import { useSearchParams } from 'react-router-dom'
import { useMay } from '../api/session-context'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { useDebounced } from '../components/layout/use-debounced'
import { ProducerList } from '../features/producers/producer-list'

export function ProducersPage() {
  const may = useMay()
  const [query, setQuery] = useSearchParams()
  const find = query.get('find') ?? ''
  return (
    <Page
      title="Producers"
      action={may('producer:write') && <LinkButton to="/producers/new" words="New producer" isMain />}
    >
      <Box role="search" sx={{ my: 4, maxWidth: 360 }}>
        <label htmlFor="find-producer">Find a name or a farm</label>
        <InputBase
          id="find-producer"
          type="search"
          fullWidth
          value={find}
          onChange={({ target }) => setQuery(target.value ? { find: target.value } : {}, { replace: true })}
        />
      </Box>
      <ProducerList find={useDebounced(find, 300)} />
    </Page>
  )
}
