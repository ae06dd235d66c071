import { SignInRequest } from '@coldfill/contract'
import { json, Router } from 'express'
import { recordEvent } from '../../commands/record-event.ts'
import type { Deps } from '../../deps.ts'
import { AppError } from '../../errors.ts'
import { notSignedIn, principalIn, requireUser } from '../../middleware/require-user.ts'
import { parseBody } from '../../parse-request.ts'
import { clearSessionCookie, readSessionCookie, setSessionCookie } from '../../sign-in/session-cookie.ts'
import { openSession, principalOf, revokeSession } from '../../sign-in/sessions.ts'
import { presentSession } from './session.presenter.ts'
import { noteSignIn, userByEmail } from './session.queries.ts'
import { signInLimits } from './sign-in-limits.ts'

export const sessionRouter = (deps: Deps): Router => {
  const { db, tokens, clock, passwords } = deps
  return Router()
    .post('/', json({ limit: '8kb' }), ...signInLimits(), async (req, res) => {
      const { email, password } = parseBody(SignInRequest, req)
      const found = await userByEmail(db, email)
      const matches = await passwords.matches(found?.user.passwordHash ?? null, password)
      if (!found || !matches || !found.user.active)
        throw new AppError(401, 'wrong_credentials', 'Not signed in', 'The e-mail address or the password is wrong.')
      const now = clock()
      // A session that the browser still has ends: each sign-in has a token of its own.
      const earlier = readSessionCookie(req)
      const old = earlier === null ? null : await principalOf(db, tokens, earlier, clock)
      if (old) await revokeSession(db, old.session.id, now)
      const { token, expiresAt } = await openSession(db, tokens, found.user.id, now)
      await noteSignIn(db, found.user.id, now)
      await recordEvent(db, { name: found.user.name, office: found.office }, now, { action: 'signed in' })
      setSessionCookie(req, res, token, expiresAt.getTime() - now.getTime())
      const principal = await principalOf(db, tokens, token, clock)
      if (!principal) throw notSignedIn()
      res.json(presentSession(principal))
    })
    .get('/', requireUser(deps), (_req, res) => {
      res.json(presentSession(principalIn(res)))
    })
    .delete('/', requireUser(deps), async (req, res) => {
      await revokeSession(db, principalIn(res).session.id, clock())
      clearSessionCookie(req, res)
      res.status(204).end()
    })
}
