import { HttpException } from '@nestjs/common'
import { Problem, type ProblemSlug } from 'shared'
import { QueryFailedError } from 'typeorm'

/** What frameworks throw by status. */
const byStatus: Record<number, ProblemSlug> = {
  400: 'malformed-request',
  401: 'not-signed-in',
  403: 'forbidden',
  404: 'not-found',
  413: 'body-too-large',
  415: 'wrong-media-type',
}

/** SQLSTATE codes of PostgreSQL that are no fault of ours. */
const bySqlState: Record<string, ProblemSlug> = {
  '22003': 'malformed-request',
  '22008': 'malformed-request',
  '22021': 'malformed-request',
  '22P02': 'malformed-request',
  '22P05': 'malformed-request',
  '23505': 'already-exists',
  '40001': 'not-ready',
  '40P01': 'not-ready',
  '53300': 'not-ready',
  '57014': 'not-ready',
  '57P01': 'not-ready',
  '57P03': 'not-ready',
}

const byErrorCode: Record<string, ProblemSlug> = {
  ECONNREFUSED: 'not-ready',
  ECONNRESET: 'not-ready',
  LIMIT_FILE_SIZE: 'body-too-large',
}

/** Every thrown thing as one of the catalogue. What nobody expected says nothing of its inside. */
export function toProblem(thrown: unknown): Problem {
  if (thrown instanceof Problem) return thrown
  return new Problem(slugOf(thrown) ?? 'unexpected')
}

function slugOf(thrown: unknown): ProblemSlug | undefined {
  if (thrown instanceof HttpException) return byStatus[thrown.getStatus()]
  if (thrown instanceof QueryFailedError) return bySqlState[codeOf(thrown.driverError) ?? '']
  if (!(thrown instanceof Error)) return undefined
  // Express and its body parsers put the status on a plain error.
  const status = 'status' in thrown && typeof thrown.status === 'number' ? byStatus[thrown.status] : undefined
  return status ?? byErrorCode[codeOf(thrown) ?? ''] ?? (isPoolTimeout(thrown) ? 'not-ready' : undefined)
}

const codeOf = (error: Error): string | undefined =>
  'code' in error && typeof error.code === 'string' ? error.code : undefined

const isPoolTimeout = ({ message }: Error): boolean => /timeout exceeded when trying to connect/.test(message)
