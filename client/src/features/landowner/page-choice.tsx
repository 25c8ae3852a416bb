import InputBase from '@mui/material/InputBase'
import NativeSelect from '@mui/material/NativeSelect'
import { useTranslation } from 'react-i18next'
import type { PacketView } from 'shared'
import { FieldFrame } from '../../components/fields/field-frame'
import { useField } from '../../components/fields/use-field'

interface PageChoiceProps {
  pages: PacketView['pages']
}

/** Which page a change is about. The form holds the page's number, or none for the whole packet. */
export function PageChoice({ pages }: PageChoiceProps) {
  const { t } = useTranslation()
  const { id, field, error } = useField('page', t('ask.page'))
  return (
    <FieldFrame id={id} label={t('ask.page')} error={error}>
      <NativeSelect
        input={<InputBase />}
        inputProps={{ id, name: 'page' }}
        inputRef={field.ref}
        value={field.value === undefined ? '' : String(field.value)}
        onChange={({ target }) => field.onChange(target.value === '' ? undefined : Number(target.value))}
        onBlur={field.onBlur}
        sx={{ width: '100%' }}
      >
        <option value="">{t('ask.whole')}</option>
        {pages.map(({ number, title }) => (
          <option key={number} value={number} lang="en">
            {number}. {title}
          </option>
        ))}
      </NativeSelect>
    </FieldFrame>
  )
}
