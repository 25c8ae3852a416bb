import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Checkbox from '@mui/material/Checkbox'
import Typography from '@mui/material/Typography'
import { useId, useState } from 'react'
import { useTranslation } from 'react-i18next'
import { consentSchema } from 'shared'
import { useConsent } from '../../api/packets'
import { Section } from '../../components/layout/section'
import { LandownerProblem } from './landowner-problem'

interface ConsentFormProps {
  packetId: string
}

/** Agreement to electronic records: its words, their version, one tick and one button. */
export function ConsentForm({ packetId }: ConsentFormProps) {
  const { t } = useTranslation()
  const consent = useConsent(packetId)
  const [agrees, setAgrees] = useState(false)
  const [isMissing, setIsMissing] = useState(false)
  const id = useId()
  const agree = () => {
    setIsMissing(!agrees)
    if (agrees && !consent.isPending) consent.mutate()
  }
  return (
    <Section title={t('consent.title')}>
      <Typography sx={{ mt: 3 }}>{t('consent.text')}</Typography>
      <Typography variant="body2" sx={{ color: 'text.secondary', my: 2 }}>
        {t('consent.version', { version: consentSchema.shape.consentVersion.value })} {t('consent.paper')}
      </Typography>
      <Box sx={{ display: 'flex', alignItems: 'center', ml: -2 }}>
        <Checkbox
          id={id}
          checked={agrees}
          onChange={(event) => {
            setAgrees(event.target.checked)
            setIsMissing(false)
          }}
          slotProps={{ input: { 'aria-describedby': isMissing ? `${id}-error` : undefined } }}
        />
        <label htmlFor={id}>{t('consent.agree')}</label>
      </Box>
      <Typography id={`${id}-error`} role="alert" sx={{ color: 'error.main', fontWeight: 600 }}>
        {isMissing && t('consent.must')}
      </Typography>
      <LandownerProblem error={consent.error} />
      <Button variant="contained" color="primary" aria-disabled={consent.isPending} onClick={agree}>
        {consent.isPending ? t('consent.saving') : t('consent.save')}
      </Button>
    </Section>
  )
}
