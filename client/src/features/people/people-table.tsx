import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import type { PersonView } from 'shared'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import { limitsText } from './limits-text'

const columns: readonly Column[] = [
  { key: 'name', title: 'Name' },
  { key: 'email', title: 'E-mail' },
  { key: 'roles', title: 'Roles' },
  { key: 'limits', title: 'Checks designs up to' },
  { key: 'active', title: 'Signs in' },
]

interface PeopleTableProps {
  people: readonly PersonView[]
}

export function PeopleTable({ people }: PeopleTableProps) {
  return (
    <RuledTable caption="People of the district" columns={columns} minWidth={760}>
      {people.map((person) => (
        <TableRow key={person.id}>
          <TableCell component="th" scope="row">
            {person.name}
          </TableCell>
          <TableCell>{person.email}</TableCell>
          <TableCell>{person.roles.join(', ')}</TableCell>
          <TableCell>{limitsText(person.approvalLimits)}</TableCell>
          <TableCell>{person.isActive ? 'yes' : 'no longer'}</TableCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
