import type { CookieOptions, Request, Response } from 'express'

const NAME = 'coldfill_session'

const options = (req: Request): CookieOptions => ({ httpOnly: true, sameSite: 'lax', secure: req.secure, path: '/' })

/** `maxAge` in milliseconds. */
export const setSessionCookie = (req: Request, res: Response, token: string, maxAge: number): void => {
  res.cookie(NAME, token, { ...options(req), maxAge })
}

export const clearSessionCookie = (req: Request, res: Response): void => {
  res.clearCookie(NAME, options(req))
}

/** The token of the request's cookie; null where there is none. */
export const readSessionCookie = (req: Request): string | null => {
  for (const part of (req.headers.cookie ?? '').split(';')) {
    const [name, ...value] = part.trim().split('=')
    if (name === NAME) return value.join('=')
  }
  return null
}
