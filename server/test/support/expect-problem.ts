import { problemCatalogue, type ProblemDocument, type ProblemSlug } from 'shared'
import type { Response } from 'supertest'

/** What only our own code, the framework or the database would say. */
const inside =
  /\bat \S+ \(|node_modules|\.[jt]s:\d+|QueryFailed|\b(select|insert into|update|delete from) \w+ |relation "/i

/** The answer is this very problem, as RFC 9457 writes it, and tells nothing of the server's inside. */
export function expectProblem(response: Response, slug: ProblemSlug): ProblemDocument {
  const { status, title } = problemCatalogue[slug]
  const body: ProblemDocument = JSON.parse(response.text)
  expect({ status: response.status, type: body.type, sent: response.headers['content-type'] }).toEqual({
    status,
    type: `urn:wadestone:problem:${slug}`,
    sent: 'application/problem+json; charset=utf-8',
  })
  expect(body).toMatchObject({ status, title })
  expect(response.text).not.toMatch(inside)
  return body
}

export const pointersOf = ({ fields = [] }: ProblemDocument): string[] => fields.map(({ pointer }) => pointer)
