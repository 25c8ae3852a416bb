import MuiLink from '@mui/material/Link'
import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'

interface TextLinkProps {
  to: string
  children: ReactNode
  isStrong?: boolean
}

export function TextLink({ to, children, isStrong = false }: TextLinkProps) {
  return (
    <MuiLink component={Link} to={to} sx={{ fontWeight: isStrong ? 600 : undefined }}>
      {children}
    </MuiLink>
  )
}
