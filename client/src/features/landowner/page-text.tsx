import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useTranslation } from 'react-i18next'

interface PageTextProps {
  lines: readonly string[]
}

/** How the packet parts the cells of a row when a page is given as text. */
const CELL = ' · '

/** Longer than this, what follows the first cell stands under it, line by line, as it would wrap into a muddle. */
const LONGEST_BESIDE = 44

const beside = { textAlign: 'right', minWidth: 0 } as const
const under = { flex: '1 1 100%', minWidth: 0, overflowWrap: 'anywhere' } as const

/** A page of the packet as text. Rows of a table stay rows, so that figures keep their place. */
export function PageText({ lines }: PageTextProps) {
  const { t } = useTranslation()
  if (lines.length === 0) return <Typography sx={{ my: 4 }}>{t('read.empty')}</Typography>
  return (
    <Box lang="en" sx={{ my: 4 }}>
      {lines.map((line, index) => (
        <PageLine key={index} cells={line.split(CELL)} />
      ))}
    </Box>
  )
}

function PageLine({ cells }: { cells: readonly string[] }) {
  const [first, ...rest] = cells
  if (rest.length === 0) return <Typography sx={{ my: 2 }}>{first}</Typography>
  const isLong = rest.join(' ').length > LONGEST_BESIDE
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        columnGap: 4,
        py: '6px',
        borderBottom: 1,
        borderColor: 'divider',
      }}
    >
      <Box component="span" sx={{ flex: '1 1 140px', minWidth: 0, fontWeight: isLong ? 600 : undefined }}>
        {first}
      </Box>
      {rest.map((cell, index) => (
        <Box component="span" key={index} className="figure" sx={isLong ? under : beside}>
          {cell}
        </Box>
      ))}
    </Box>
  )
}
