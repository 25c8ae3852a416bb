import { execFile } from 'node:child_process'
import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { promisify } from 'node:util'
import { simpleParser } from 'mailparser'
import type { ExampleJob } from 'shared'
import { runFolder } from './sign-ins.js'

const run = promisify(execFile)
const root = join(import.meta.dirname, '..', '..', '..')
const examples = join(root, 'shared', 'examples')

export type ExampleName = 'north-pond' | 'lower-tank'

export interface TourResult {
  figures: Record<string, { value: number | string; unit: string }>
  steps: { who: string; what: string; figure: string | null; state?: string }[]
  packets: { id: string; kind: 'A' | 'B'; revision: number; sha256: string }[]
  pages: { number: number; title: string }[]
}

export interface TourRun {
  result: TourResult
  /** Text of each page of packet B, as a reader's search would find it. */
  pageTexts: string[]
  pdfFile: string
  attachment: Buffer
}

const readExample = (name: ExampleName): ExampleJob =>
  JSON.parse(readFileSync(join(examples, `${name}.json`), 'utf8')) as ExampleJob

/** An example with a change made by hand, as a file of its own. */
export function changedExample(name: ExampleName, change: (job: ExampleJob) => void): string {
  const job = readExample(name)
  change(job)
  const file = join(mkdtempSync(join(tmpdir(), 'wadestone-tour-')), 'job.json')
  writeFileSync(file, JSON.stringify(job))
  return file
}

export const exampleFile = (name: ExampleName): string => join(examples, `${name}.json`)

const notesOf = (name: ExampleName): string => join(examples, readExample(name).survey.notesFile)

/** `npm run tour` itself, against the Wadestone that these tests run on. */
async function runTour(name: ExampleName, input: string): Promise<string> {
  const out = mkdtempSync(join(tmpdir(), 'wadestone-tour-'))
  await run(process.execPath, [join(root, 'scripts/tour.mjs'), '--input', input, '--notes', notesOf(name)], {
    env: { ...process.env, RUN_FOLDER: runFolder, TOUR_OUT: out },
  })
  return out
}

export async function tour(name: ExampleName, input = exampleFile(name)): Promise<TourRun> {
  const out = await runTour(name, input)
  const pdfFile = join(out, 'packet.pdf')
  const { stdout: text } = await run('pdftotext', ['-layout', pdfFile, '-'], { maxBuffer: 64 * 1024 * 1024 })
  const mail = await simpleParser(readFileSync(join(out, 'mail.eml')))
  const [attachment] = mail.attachments
  if (attachment === undefined) throw new Error('The mail carries no packet.')
  return {
    result: JSON.parse(readFileSync(join(out, 'result.json'), 'utf8')) as TourResult,
    pageTexts: text.split('\f').slice(0, -1),
    pdfFile,
    attachment: attachment.content,
  }
}

/** What a tour that stops says. */
export async function stoppedTour(name: ExampleName, input: string): Promise<{ code: number; said: string }> {
  try {
    await runTour(name, input)
  } catch (error) {
    const { code, stderr } = error as { code: number; stderr: string }
    return { code, said: stderr }
  }
  throw new Error('The tour went through.')
}

export const qpdfCheck = async (file: string): Promise<string> =>
  (await run('qpdf', ['--check', file])).stdout
