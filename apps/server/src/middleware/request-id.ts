import { randomUUID } from 'node:crypto'
import type { RequestHandler } from 'express'

/** Gives each request an id that its answer, its problem body and the log of the server carry. */
export const requestId: RequestHandler = (_req, res, next) => {
  const id = randomUUID()
  res.locals['requestId'] = id
  res.setHeader('X-Request-Id', id)
  next()
}
