import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { DesignResult, ResolvedWith } from 'shared'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { StatusLine } from '../../components/feedback/status-line'
import { TextLink } from '../../components/layout/text-link'
import type { PartSpec } from './part-spec'
import { ResultPanel } from './result-panel'

interface ResultSideProps {
  spec: PartSpec
  designPath: string
  result: DesignResult
  resolvedWith: ResolvedWith
  isBegun: boolean
  /** The part on the page is not complete, so that the figures are of what was complete before. */
  isBehind: boolean
  isWorking: boolean
  problem: Error | null
}

const counted = (result: DesignResult, verdict: 'pass' | 'caution' | 'fail'): number =>
  result.checks.filter((check) => check.verdict === verdict).length

/** What follows from the part, beside its form. */
export function ResultSide(props: ResultSideProps) {
  const { spec, designPath, result, resolvedWith, isBegun, isBehind, isWorking, problem } = props
  const jobPath = designPath.replace(/\/design\/.*$/, '')
  return (
    <Box component="aside" aria-label="What follows" aria-busy={isWorking} sx={{ minWidth: 0 }}>
      <StatusLine words={isWorking ? 'Working it out…' : null} />
      {isBehind && (
        <Typography sx={{ borderLeft: 4, borderColor: 'warning.main', pl: 4 }}>
          This part is not complete. The figures are of what was complete before.
        </Typography>
      )}
      <ProblemAlert error={problem} />
      {spec.results.map((key) => (
        <ResultPanel
          key={key}
          resultKey={key}
          result={result}
          part={spec.part}
          designPath={designPath}
          isBegun={isBegun}
        />
      ))}
      {resolvedWith.missing.length > 0 && (
        <Box component="ul" sx={{ pl: 5, mt: 4 }}>
          {resolvedWith.missing.map((sentence) => (
            <li key={sentence}>{sentence}</li>
          ))}
        </Box>
      )}
      <Typography sx={{ mt: 6 }}>
        Checks: {counted(result, 'pass')} hold, {counted(result, 'caution')} caution,{' '}
        {counted(result, 'fail')} {counted(result, 'fail') === 1 ? 'fails' : 'fail'}.{' '}
        <TextLink to={`${jobPath}/checks`}>See the checks of the chosen design</TextLink>
      </Typography>
    </Box>
  )
}
