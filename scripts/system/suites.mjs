import { spawnSync } from 'node:child_process'
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { root } from './places.mjs'

/** jest and vitest write the same summary. */
const countJestLike = (report) => ({
  passed: report.numPassedTests,
  failed: report.numFailedTests + (report.numRuntimeErrorTestSuites ?? 0),
  skipped: report.numPendingTests + (report.numTodoTests ?? 0),
})

const countPlaywright = ({ stats, errors }) => ({
  passed: stats.expected + stats.flaky,
  failed: stats.unexpected + errors.length,
  skipped: stats.skipped,
})

const vitest = (out) => [
  'node_modules/vitest/vitest.mjs',
  'run',
  '--reporter=default',
  '--reporter=json',
  `--outputFile.json=${out}`,
]

/** The suites of the project: where each runs, with which words, and how its report is counted. */
export const suites = [
  { name: 'shared', folder: 'shared', words: vitest, count: countJestLike },
  { name: 'client', folder: 'client', words: vitest, count: countJestLike },
  {
    name: 'server',
    folder: 'server',
    words: (out) => ['node_modules/jest/bin/jest.js', '--json', `--outputFile=${out}`, '--forceExit=false'],
    count: countJestLike,
  },
  {
    name: 'browser',
    folder: 'client',
    words: () => ['node_modules/@playwright/test/cli.js', 'test', '--reporter=list,json'],
    env: (out) => ({ PLAYWRIGHT_JSON_OUTPUT_NAME: out }),
    count: countPlaywright,
  },
]

/** Runs one suite and returns its counts. A suite without one test, or that died, has failed. */
export function runSuite(suite, { reportFolder, env }) {
  const out = join(reportFolder, `${suite.name}.json`)
  const [program, ...words] = suite.words(out)
  console.log(`\n── ${suite.name} ──`)
  const { status } = spawnSync(process.execPath, [join(root, program), ...words], {
    cwd: join(root, suite.folder),
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, ...env, ...suite.env?.(out) },
  })
  if (!existsSync(out)) {
    console.error(`The suite ${suite.name} left no report.`)
    return { passed: 0, failed: 1, skipped: 0 }
  }
  const counts = suite.count(JSON.parse(readFileSync(out, 'utf8')))
  const ranNothing = counts.passed + counts.failed === 0
  if (ranNothing) console.error(`The suite ${suite.name} ran no test.`)
  if (status !== 0 && counts.failed === 0) counts.failed = 1
  if (ranNothing) counts.failed = 1
  return counts
}
