import Button from '@mui/material/Button'
import { useFormContext } from 'react-hook-form'

interface SubmitButtonProps {
  words: string
  /** What the button says while it works. */
  busyWords: string
  isQuiet?: boolean
}

/** Stays focusable while it works; a second press does nothing, since the form refuses to submit twice. */
export function SubmitButton({ words, busyWords, isQuiet = false }: SubmitButtonProps) {
  const { isSubmitting } = useFormContext().formState
  return (
    <Button
      type="submit"
      variant={isQuiet ? 'outlined' : 'contained'}
      color={isQuiet ? 'inherit' : 'primary'}
      aria-disabled={isSubmitting}
    >
      {isSubmitting ? busyWords : words}
    </Button>
  )
}
