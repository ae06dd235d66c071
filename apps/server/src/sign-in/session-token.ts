import { createHash, randomBytes } from 'node:crypto'
import { jwtVerify, SignJWT } from 'jose'

const ISSUER = 'coldfill'
const AUDIENCE = 'coldfill-session'
const TYPE = 'coldfill-session+jwt'

export interface SessionTokens {
  /** A token that names the session. The row in the database decides whether it is worth anything. */
  sign(session: string, expiresAt: Date): Promise<string>
  /** The session named; null where the token is forged, altered, over or of another kind. */
  read(token: string): Promise<string | null>
}

/** 256 random bits. */
export const newSessionName = (): string => randomBytes(32).toString('base64url')

/** What the database holds in place of the name. */
export const sessionId = (name: string): string => createHash('sha256').update(name).digest('hex')

export const createSessionTokens = (secret: string, now: () => Date): SessionTokens => {
  const key = createHash('sha256').update(secret).digest()
  return {
    sign: (session, expiresAt) =>
      new SignJWT({})
        .setProtectedHeader({ alg: 'HS256', typ: TYPE })
        .setIssuer(ISSUER)
        .setAudience(AUDIENCE)
        .setJti(session)
        .setIssuedAt(now())
        .setExpirationTime(expiresAt)
        .sign(key),
    read: async (token) => {
      try {
        const { payload } = await jwtVerify(token, key, {
          algorithms: ['HS256'],
          issuer: ISSUER,
          audience: AUDIENCE,
          typ: TYPE,
          requiredClaims: ['jti', 'exp'],
          currentDate: now(),
        })
        return payload.jti ?? null
      } catch {
        return null
      }
    },
  }
}
