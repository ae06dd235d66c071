import type { ProblemIssue } from '@coldfill/contract'
import type { ErrorRequestHandler, RequestHandler, Response } from 'express'
import { describeError } from '../describe-error.ts'
import { AppError, notFound } from '../errors.ts'
import type { Log } from '../log.ts'

interface ProblemMembers {
  readonly status: number
  readonly code: string
  readonly title: string
  readonly detail: string
  readonly errors?: readonly ProblemIssue[]
  readonly [extension: string]: unknown
}

const send = (res: Response, problem: ProblemMembers): void => {
  const instance = `urn:uuid:${String(res.locals['requestId'])}`
  res
    .status(problem.status)
    .type('application/problem+json')
    .send(JSON.stringify({ type: `/problems/${problem.code}`, ...problem, instance }))
}

/** Errors that Express and its body parsers raise by themselves, in words of ours. */
const FRAMEWORK: Readonly<Record<number, { code: string; title: string; detail: string }>> = {
  400: {
    code: 'bad_request',
    title: 'The request cannot be read',
    detail: 'The body is not JSON, or the address is malformed.',
  },
  413: {
    code: 'too_large',
    title: 'The request is too large',
    detail: 'A spec may have 256 kB, a catalogue file 2 MB.',
  },
  415: {
    code: 'unsupported_type',
    title: 'The content type is not supported',
    detail: 'Send application/json in UTF-8.',
  },
}

const frameworkStatus = (error: unknown): number | null => {
  const status = typeof error === 'object' && error !== null && 'status' in error ? error.status : null
  return typeof status === 'number' && status >= 400 && status < 500 ? status : null
}

export const unknownAddress: RequestHandler = () => {
  throw notFound()
}

export const errorHandler =
  (log: Log): ErrorRequestHandler =>
  (error: unknown, req, res, next) => {
    if (res.headersSent) {
      next(error)
      return
    }
    if (error instanceof AppError) {
      const { status, code, title, message, issues, extension } = error
      send(res, { status, code, title, detail: message, ...(issues ? { errors: [...issues] } : {}), ...extension })
      return
    }
    const status = frameworkStatus(error)
    if (status !== null) {
      const words = FRAMEWORK[status] ?? { code: 'bad_request', title: 'The request cannot be read', detail: '' }
      send(res, { status, ...words })
      return
    }
    log.error(`${String(res.locals['requestId'])} ${req.method} ${req.path}: ${describeError(error)}`)
    send(res, {
      status: 500,
      code: 'internal',
      title: 'Something went wrong here',
      detail: 'The server could not do this. Nothing of it was saved. The id below finds it in the log.',
      retryable: true,
    })
  }
