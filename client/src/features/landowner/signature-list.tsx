import Box from '@mui/material/Box'
import { useTranslation } from 'react-i18next'
import type { PacketView } from 'shared'
import { Instant } from '../../components/layout/instant'
import { Section } from '../../components/layout/section'

interface SignatureListProps {
  signatures: PacketView['signatures']
}

/** Who has signed and when. A signature that no longer counts stays and says so. */
export function SignatureList({ signatures }: SignatureListProps) {
  const { t } = useTranslation()
  if (signatures.length === 0) return null
  return (
    <Section title={t('job.signed')}>
      {signatures.map(({ name, signedAt, isVoid }) => (
        <Box
          key={`${name} ${signedAt}`}
          sx={{
            py: 2,
            borderBottom: 1,
            borderColor: 'divider',
            color: isVoid ? 'text.secondary' : undefined,
          }}
        >
          {isVoid ? <s>{name}</s> : name}, <Instant at={signedAt} />
          {isVoid && <Box sx={{ color: 'warning.main' }}>{t('job.void')}</Box>}
        </Box>
      ))}
    </Section>
  )
}
