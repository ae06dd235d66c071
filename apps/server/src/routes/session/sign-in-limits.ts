import { createHash } from 'node:crypto'
import type { RequestHandler } from 'express'
import { ipKeyGenerator, rateLimit } from 'express-rate-limit'
import { AppError } from '../../errors.ts'

const WINDOW_MS = 15 * 60_000

const tooMany = (): AppError =>
  new AppError(429, 'too_many_attempts', 'Too many attempts to sign in', 'Wait a quarter of an hour, then try again.', {
    extension: { retryable: true },
  })

const limiter = (limit: number, key: (ip: string, email: string) => string): RequestHandler =>
  rateLimit({
    windowMs: WINDOW_MS,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // Only failures are counted: a person who signs in well is never shut out by it.
    skipSuccessfulRequests: true,
    keyGenerator: (req) => {
      const email: unknown = (req.body as { email?: unknown } | undefined)?.email
      return key(ipKeyGenerator(req.ip ?? ''), typeof email === 'string' ? email.trim().toLowerCase() : '')
    },
    handler: (_req, _res, next) => {
      next(tooMany())
    },
  })

/** Failed attempts in a quarter of an hour: 10 on one account, from wherever, and 50 from one address, on whatever account. */
export const signInLimits = (): RequestHandler[] => [
  limiter(50, (ip) => `ip ${ip}`),
  limiter(10, (_ip, email) => `account ${createHash('sha256').update(email).digest('hex')}`),
]
