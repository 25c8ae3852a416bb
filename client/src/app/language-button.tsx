import Button from '@mui/material/Button'
import { useTranslation } from 'react-i18next'
import { changeLanguage } from '../i18n/i18n'

/** Names the other language in that language. */
export function LanguageButton() {
  const { t, i18n } = useTranslation()
  const other = i18n.language === 'es' ? 'en' : 'es'
  return (
    <Button variant="text" lang={other} onClick={() => void changeLanguage(other)}>
      {t('shell.otherLanguage')}
    </Button>
  )
}
