import Typography from '@mui/material/Typography'
import { Fragment } from 'react'
import type { PartFailed, PartWaiting } from 'shared'
import { TextLink } from '../../components/layout/text-link'
import { fieldPlace, partPlace, type PlacedDesign } from './design-place'
import { waitedForWords } from './waited-for-words'

interface NotReadyNoteProps {
  design: PlacedDesign
  result: PartFailed | PartWaiting
}

/** Why something is not worked out, and the way to what would help. */
export function NotReadyNote({ design, result }: NotReadyNoteProps) {
  if ('message' in result) {
    return (
      <Typography>
        {result.message} <TextLink to={fieldPlace(design, result.field)}>Go there</TextLink>
      </Typography>
    )
  }
  return (
    <Typography>
      Waits for{' '}
      {result.waitingFor.map((name, index) => (
        <Fragment key={name}>
          {index > 0 && ', '}
          <TextLink to={partPlace(design, name)}>{waitedForWords(name)}</TextLink>
        </Fragment>
      ))}
      .
    </Typography>
  )
}
