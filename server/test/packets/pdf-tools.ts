import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** Hands the bytes to a program as a file, and takes the file away again. */
function withFile<Answer>(bytes: Uint8Array, use: (file: string) => Answer): Answer {
  const folder = mkdtempSync(join(tmpdir(), 'packet-'))
  try {
    const file = join(folder, 'packet.pdf')
    writeFileSync(file, bytes)
    return use(file)
  } finally {
    rmSync(folder, { recursive: true })
  }
}

const run = (program: string, ...args: string[]) =>
  execFileSync(program, args, { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 })

/** The text of each page, as a reader's search would find it. */
export function pageTexts(bytes: Uint8Array): string[] {
  const text = withFile(bytes, (file) => run('pdftotext', '-layout', file, '-'))
  return text.split('\f').slice(0, -1)
}

export const qpdfCheck = (bytes: Uint8Array): string =>
  withFile(bytes, (file) => run('qpdf', '--check', file))

export const pdfInfo = (bytes: Uint8Array, ...options: string[]): string =>
  withFile(bytes, (file) => run('pdfinfo', ...options, file))

export const pdfFonts = (bytes: Uint8Array): string => withFile(bytes, (file) => run('pdffonts', file))

/** Each page as a picture, for a comparison of two files. */
export function pagePictures(bytes: Uint8Array, last: number): string[] {
  return withFile(bytes, (file) =>
    Array.from({ length: last }, (_, index) =>
      execFileSync(
        'pdftoppm',
        ['-r', '40', '-gray', '-f', String(index + 1), '-l', String(index + 1), file],
        {
          maxBuffer: 64 * 1024 * 1024,
        },
      ).toString('base64'),
    ),
  )
}
