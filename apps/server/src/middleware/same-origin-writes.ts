import type { RequestHandler } from 'express'
import { AppError } from '../errors.ts'

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS'])

const refuse = (detail: string): AppError =>
  new AppError(403, 'cross_site_request', 'This request did not come from the application', detail)

/**
 * A page of another site can make a browser send a form with the cookie, but not with a header of its own choice, and not with
 * another origin. So a write must have the header, be JSON, and where the browser says an origin, say this one.
 */
export const sameOriginWrites: RequestHandler = (req, _res, next) => {
  if (SAFE.has(req.method)) {
    next()
    return
  }
  if (req.get('X-Requested-With') !== 'coldfill') throw refuse('Writes carry the header X-Requested-With: coldfill.')
  const site = req.get('Sec-Fetch-Site')
  if (site !== undefined && site !== 'same-origin' && site !== 'none') throw refuse('It came from another site.')
  const origin = req.get('Origin')
  if (origin !== undefined && !isOwnOrigin(origin, req.get('Host'))) throw refuse('It came from another origin.')
  const hasBody = req.headers['transfer-encoding'] !== undefined || Number(req.headers['content-length'] ?? 0) > 0
  if (hasBody && !req.is('application/json'))
    throw new AppError(415, 'unsupported_type', 'The content type is not supported', 'Send application/json in UTF-8.')
  next()
}

const isOwnOrigin = (origin: string, host: string | undefined): boolean => {
  try {
    return new URL(origin).host === host
  } catch {
    return false
  }
}
