import Box from '@mui/material/Box'
import { LoadingLines } from '../components/feedback/loading-lines'

export function PageLoading() {
  return (
    <Box sx={{ px: { xs: 4, md: 6 }, py: 4 }}>
      <LoadingLines />
    </Box>
  )
}
