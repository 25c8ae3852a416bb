import Button from '@mui/material/Button'
import { Link } from 'react-router-dom'

interface LinkButtonProps {
  to: string
  words: string
  isMain?: boolean
}

export function LinkButton({ to, words, isMain = false }: LinkButtonProps) {
  return (
    <Button
      component={Link}
      to={to}
      variant={isMain ? 'contained' : 'outlined'}
      color={isMain ? 'primary' : 'inherit'}
    >
      {words}
    </Button>
  )
}
