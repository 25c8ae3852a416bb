import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useEffect, useRef } from 'react'
import { NavLink } from 'react-router-dom'
import type { DesignPart, DesignResult } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { partCatalogue } from './part-catalogue'
import { partMark } from './part-mark'
import type { PlanDraft, Savable } from './plan-draft'

interface PartNavProps {
  part: DesignPart
  designPath: string
  draft: PlanDraft
  unfinished: Savable['unfinished']
  changed: readonly DesignPart[]
  result: DesignResult
}

const isBegun = (draft: PlanDraft, part: DesignPart): boolean => Boolean(draft[part])

/** The parts of the design in a row, each with how it stands. On a phone the row scrolls. */
export function PartNav({ part, designPath, draft, unfinished, changed, result }: PartNavProps) {
  const bar = useRef<HTMLElement>(null)
  useEffect(() => {
    const current = bar.current?.querySelector<HTMLElement>('[aria-current="page"]')
    current?.scrollIntoView?.({ block: 'nearest', inline: 'center' })
  }, [part])
  return (
    <Box
      component="nav"
      ref={bar}
      aria-label="Parts of the design"
      sx={{ display: 'flex', flexWrap: { lg: 'wrap' }, overflowX: 'auto', my: 3, rowGap: 2 }}
    >
      {partCatalogue.map((spec) => {
        const mark = partMark({ spec, result, unfinished, isBegun: isBegun(draft, spec.part) })
        return (
          <Box
            key={spec.part}
            component={NavLink}
            to={`${designPath}/${spec.part}`}
            sx={{
              flex: 'none',
              width: 132,
              px: 2,
              py: 1,
              color: 'text.primary',
              textDecoration: 'none',
              borderLeft: 1,
              borderColor: 'divider',
              '&.active': { borderLeft: 4, borderColor: 'primary.main' },
            }}
          >
            <Typography sx={{ fontWeight: 600 }}>{spec.title}</Typography>
            <Typography variant="body2" component="div">
              <VerdictMark kind={mark.kind} words={mark.words} />
              {changed.includes(spec.part) && <div>not saved</div>}
            </Typography>
          </Box>
        )
      })}
    </Box>
  )
}
