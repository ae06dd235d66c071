import type { RequestHandler, Response } from 'express'
import type { Deps } from '../deps.ts'
import { AppError } from '../errors.ts'
import { readSessionCookie } from '../sign-in/session-cookie.ts'
import { type Principal, principalOf } from '../sign-in/sessions.ts'

export const notSignedIn = (): AppError =>
  new AppError(401, 'not_signed_in', 'You are not signed in', 'Sign in and try again. What you typed is kept.')

/** Lets a request through with the person behind its cookie, read from the database each time. */
export const requireUser =
  ({ db, tokens, clock }: Deps): RequestHandler =>
  async (req, res, next) => {
    const token = readSessionCookie(req)
    const principal = token === null ? null : await principalOf(db, tokens, token, clock)
    if (!principal) throw notSignedIn()
    res.locals['principal'] = principal
    next()
  }

/** Programmer's mistake where the route does not stand behind requireUser: throws. */
export const principalIn = (res: Response): Principal => {
  const principal = res.locals['principal'] as Principal | undefined
  if (!principal) throw new Error('This route does not require a user.')
  return principal
}
