import Box from '@mui/material/Box'
import LinearProgress from '@mui/material/LinearProgress'
import { useTranslation } from 'react-i18next'
import type { PacketView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Section } from '../../components/layout/section'
import { TextLink } from '../../components/layout/text-link'

interface PageListProps {
  packet: PacketView
}

/** Every page of the packet, with which of them are read. */
export function PageList({ packet }: PageListProps) {
  const { t } = useTranslation()
  const { pages, pagesReadByMe } = packet
  const progress = t('job.pagesRead', { read: pagesReadByMe.length, all: pages.length })
  return (
    <Section title={t('job.pages')} aside={progress}>
      <LinearProgress
        variant="determinate"
        aria-label={progress}
        value={pages.length === 0 ? 0 : (pagesReadByMe.length / pages.length) * 100}
      />
      <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {pages.map(({ number, title }) => {
          const isRead = pagesReadByMe.includes(number)
          return (
            <Box
              component="li"
              key={number}
              sx={{
                display: 'flex',
                gap: 3,
                alignItems: 'center',
                minHeight: 44,
                borderBottom: 1,
                borderColor: 'divider',
                '& > a': { flex: 1, py: '12px' },
              }}
            >
              <Box component="span" className="figure" sx={{ width: 24, textAlign: 'right' }}>
                {number}
              </Box>
              <TextLink to={`/my/${packet.jobId}/read/${number}`}>
                <span lang="en">{title}</span>
              </TextLink>
              <VerdictMark
                kind={isRead ? 'pass' : 'waiting'}
                words={isRead ? t('job.readDone') : t('job.notReadYet')}
              />
            </Box>
          )
        })}
      </Box>
    </Section>
  )
}
