import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useChooseDistrict } from '../../api/session'
import { useSession } from '../../api/session-context'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { Section } from '../../components/layout/section'

/** For those who work in several districts: nothing of one is visible in another, so one is chosen. */
export function DistrictChoice() {
  const { memberships, district } = useSession()
  const choose = useChooseDistrict()
  if (memberships.length < 2) return null
  return (
    <Section title="Your districts">
      <ProblemAlert error={choose.error} />
      {memberships.map(({ districtId, districtName, roles }) => (
        <Box
          key={districtId}
          sx={{
            display: 'flex',
            gap: 4,
            alignItems: 'center',
            py: 2,
            borderBottom: 1,
            borderColor: 'divider',
          }}
        >
          <Box sx={{ flex: 1 }}>
            <strong>{districtName}</strong>, {roles.join(', ')}
          </Box>
          {districtId === district.id ? (
            'you are here'
          ) : (
            <Button
              aria-disabled={choose.isPending}
              onClick={() => {
                if (!choose.isPending) choose.mutate(districtId)
              }}
            >
              Go to {districtName}
            </Button>
          )}
        </Box>
      ))}
    </Section>
  )
}
