import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { SettingView } from 'shared'
import { NumberField } from '../../components/fields/number-field'
import { TextField } from '../../components/fields/text-field'
import { rangeWords } from './range-words'

interface SettingRowProps {
  setting: SettingView
}

/** One setting: value with unit, range and what it is for, then where it comes from and of what date. */
export function SettingRow({ setting }: SettingRowProps) {
  const { key, label, unit, hint } = setting
  const at = `entries.${key}`
  return (
    <Box
      role="group"
      aria-label={label}
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr', md: '2fr 2fr 1fr' },
        gap: 4,
        alignItems: 'end',
        py: 4,
        borderBottom: 1,
        borderColor: 'divider',
      }}
    >
      <NumberField
        name={`${at}.value`}
        label={label}
        unit={unit}
        hint={
          <>
            {hint}{' '}
            <Typography component="span" variant="body2" className="figure">
              {rangeWords(setting)}
            </Typography>
          </>
        }
      />
      <TextField name={`${at}.source`} label={`Source of ${label.toLowerCase()}`} />
      <TextField name={`${at}.sourceDate`} label="Date of the source" type="date" />
    </Box>
  )
}
