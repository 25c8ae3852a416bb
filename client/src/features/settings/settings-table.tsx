import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import { formatCivilDate, trimmedNumber, type SettingsView } from 'shared'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'
import { Section } from '../../components/layout/section'
import { rangeWords } from './range-words'
import { settingGroups } from './setting-groups'

const columns: readonly Column[] = [
  { key: 'label', title: 'Setting' },
  { key: 'value', title: 'Value', isFigure: true },
  { key: 'source', title: 'Source' },
  { key: 'date', title: 'Of' },
]

const MOST_PLACES = 4

interface SettingsTableProps {
  view: SettingsView
}

/** For those who may see the settings and not change them. */
export function SettingsTable({ view }: SettingsTableProps) {
  return settingGroups(view).map(({ title, why, settings }) => (
    <Section key={title} title={title} aside={settings.length}>
      <Typography sx={{ mt: 2, color: 'text.secondary' }}>{why}</Typography>
      <RuledTable caption={title} columns={columns} minWidth={640}>
        {settings.map((setting) => (
          <TableRow key={setting.key}>
            <TableCell component="th" scope="row">
              {setting.label}
              <Typography variant="body2" sx={{ color: 'text.secondary' }}>
                {setting.hint} {rangeWords(setting)}
              </Typography>
            </TableCell>
            <FigureCell unit={setting.value === null ? undefined : setting.unit}>
              {setting.value === null ? 'empty' : trimmedNumber(setting.value, MOST_PLACES)}
            </FigureCell>
            <TableCell>{setting.source}</TableCell>
            <TableCell sx={{ whiteSpace: 'nowrap' }}>
              {setting.sourceDate && formatCivilDate(setting.sourceDate)}
            </TableCell>
          </TableRow>
        ))}
      </RuledTable>
    </Section>
  ))
}
