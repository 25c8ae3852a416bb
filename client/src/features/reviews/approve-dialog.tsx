import Button from '@mui/material/Button'
import Dialog from '@mui/material/Dialog'
import DialogActions from '@mui/material/DialogActions'
import DialogContent from '@mui/material/DialogContent'
import Typography from '@mui/material/Typography'

interface ApproveDialogProps {
  isOpen: boolean
  isBusy: boolean
  revision: number
  words: string
  onApprove: () => void
  onClose: () => void
}

/** Asked because an approval cannot be undone. */
export function ApproveDialog({ isOpen, isBusy, revision, words, onApprove, onClose }: ApproveDialogProps) {
  return (
    <Dialog open={isOpen} onClose={onClose} aria-labelledby="approve-title">
      <DialogContent>
        <Typography variant="h2" id="approve-title">
          {words} revision {revision}?
        </Typography>
        <Typography sx={{ mt: 2 }}>
          This seals the packet and cannot be undone. A later change would open revision {revision + 1}.
        </Typography>
      </DialogContent>
      <DialogActions>
        <Button variant="text" onClick={onClose}>
          Not yet
        </Button>
        <Button
          variant="contained"
          color="primary"
          aria-disabled={isBusy}
          onClick={isBusy ? undefined : onApprove}
        >
          {isBusy ? 'Approving…' : `${words} revision ${revision}`}
        </Button>
      </DialogActions>
    </Dialog>
  )
}
