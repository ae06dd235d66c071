import type { ProblemIssue } from '@coldfill/contract'

/** Something a request asked for that cannot be given: answered as problem+json with these words. */
export class AppError extends Error {
  readonly status: number
  /** lower_snake, stable. */
  readonly code: string
  readonly title: string
  readonly issues: readonly ProblemIssue[] | undefined
  /** Further members of the problem, as `current` of a version conflict. */
  readonly extension: Readonly<Record<string, unknown>>

  constructor(
    status: number,
    code: string,
    title: string,
    detail: string,
    more: { issues?: readonly ProblemIssue[]; extension?: Readonly<Record<string, unknown>> } = {},
  ) {
    super(detail)
    this.status = status
    this.code = code
    this.title = title
    this.issues = more.issues
    this.extension = more.extension ?? {}
  }
}

/** The same answer for what does not exist and for what another office has, so that nothing can be found out by guessing. */
export const notFound = (): AppError =>
  new AppError(404, 'not_found', 'Not found', 'There is nothing at this address for you.')

export const notAllowed = (why: string): AppError => new AppError(403, 'not_allowed', 'Not allowed', why)

export const badBody = (issues: readonly ProblemIssue[]): AppError =>
  new AppError(
    400,
    'bad_request_body',
    'The request is not right',
    issues.length === 1 ? (issues[0]?.message ?? '') : `${issues.length} things are wrong with the request.`,
    { issues },
  )
