import Box from '@mui/material/Box'
import Checkbox from '@mui/material/Checkbox'
import Typography from '@mui/material/Typography'
import type { Role } from 'shared'
import { errorId } from '../../components/fields/field-frame'
import { useField } from '../../components/fields/use-field'
import { staffRoles } from './role-words'

/** One tick a role. The first tick carries the id that the list of errors leads to. */
export function RoleChoice() {
  const { id, field, error } = useField('roles', 'Roles')
  const chosen: readonly Role[] = Array.isArray(field.value) ? field.value : []
  return (
    <Box
      component="fieldset"
      sx={{ border: 0, p: 0, m: 0, minWidth: 0 }}
      aria-describedby={error && errorId(id)}
    >
      <Typography component="legend" sx={{ fontWeight: 600, p: 0 }}>
        Roles
      </Typography>
      {staffRoles.map(({ role, does }, index) => {
        const boxId = index === 0 ? id : `${id}-${role}`
        return (
          <Box key={role} sx={{ display: 'flex', alignItems: 'center', minHeight: 44 }}>
            <Checkbox
              id={boxId}
              checked={chosen.includes(role)}
              onChange={({ target }) =>
                field.onChange(target.checked ? [...chosen, role] : chosen.filter((one) => one !== role))
              }
              sx={{ p: 1, ml: -1, mr: 2 }}
            />
            <label htmlFor={boxId}>
              <strong>{role}</strong>: {does}
            </label>
          </Box>
        )
      })}
      {error && (
        <Typography id={errorId(id)} variant="body2" sx={{ color: 'error.main', fontWeight: 600 }}>
          {error}
        </Typography>
      )}
    </Box>
  )
}
