import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import type { ProducerView } from 'shared'
import { useMay } from '../../api/session-context'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import { TextLink } from '../../components/layout/text-link'

const columns: readonly Column[] = [
  { key: 'name', title: 'Name' },
  { key: 'farm', title: 'Farm or ranch' },
  { key: 'email', title: 'E-mail' },
  { key: 'phone', title: 'Telephone' },
  { key: 'address', title: 'Postal address' },
]

interface ProducerTableProps {
  producers: readonly ProducerView[]
}

export function ProducerTable({ producers }: ProducerTableProps) {
  const may = useMay()
  return (
    <RuledTable caption="Producers" columns={columns} minWidth={800}>
      {producers.map(({ id, name, farmName, email, phone, address }) => (
        <TableRow key={id}>
          <TableCell component="th" scope="row">
            {may('producer:write') ? <TextLink to={`/producers/${id}`}>{name}</TextLink> : name}
          </TableCell>
          <TableCell>{farmName}</TableCell>
          <TableCell>{email ?? 'none, packets go by post'}</TableCell>
          <TableCell>{phone ?? ''}</TableCell>
          <TableCell>
            {address
              ? [address.street, address.town, `${address.region} ${address.postalCode}`].join(', ')
              : ''}
          </TableCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
