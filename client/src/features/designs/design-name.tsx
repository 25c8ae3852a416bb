import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useState } from 'react'
import type { DesignView } from 'shared'
import { TextLink } from '../../components/layout/text-link'
import { RenameDesignForm } from './rename-design-form'

interface DesignNameProps {
  design: DesignView
  path: string
  isLocked: boolean
}

/** The name of a design, which leads to its first part, and the way to another name. */
export function DesignName({ design, path, isLocked }: DesignNameProps) {
  const [isRenaming, setIsRenaming] = useState(false)
  if (isRenaming) return <RenameDesignForm design={design} onDone={() => setIsRenaming(false)} />
  return (
    <Box>
      <TextLink to={path} isStrong>
        {design.name}
      </TextLink>
      {!isLocked && (
        <Box>
          <Button variant="text" onClick={() => setIsRenaming(true)}>
            Rename<span className="visually-hidden"> {design.name}</span>
          </Button>
        </Box>
      )}
    </Box>
  )
}
