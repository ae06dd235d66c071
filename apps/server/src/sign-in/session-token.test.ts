import { SignJWT } from 'jose'
import { expect, it } from 'vitest'
import { createSessionTokens, newSessionName } from './session-token.ts'

let now = new Date('2026-03-02T09:00:00Z')
const later = (minutes: number): Date => new Date(now.getTime() + minutes * 60_000)
const tokens = createSessionTokens('a secret that is long enough for this', () => now)

it('reads what it signed until it is over', async () => {
  const token = await tokens.sign('the session', later(10))
  expect(await tokens.read(token)).toBe('the session')
  now = later(11)
  expect(await tokens.read(token)).toBeNull()
})

it('reads nothing that was altered, signed by another secret, unsigned or meant for something else', async () => {
  const token = await tokens.sign('the session', later(10))
  const [head, , signature] = token.split('.')
  const payload = Buffer.from(
    JSON.stringify({ jti: 'another', iss: 'coldfill', aud: 'coldfill-session', exp: 9e9 }),
  ).toString('base64url')
  const other = createSessionTokens('another secret, which is long enough too', () => now)
  const none = `${Buffer.from('{"alg":"none","typ":"coldfill-session+jwt"}').toString('base64url')}.${payload}.`
  const elsewhere = await new SignJWT({})
    .setProtectedHeader({ alg: 'HS256' })
    .setJti('x')
    .setExpirationTime(later(10))
    .sign(new TextEncoder().encode('a secret that is long enough for this'))
  for (const forged of [
    `${head}.${payload}.${signature}`,
    await other.sign('the session', later(10)),
    none,
    elsewhere,
    '',
    'x.y.z',
  ])
    expect(await tokens.read(forged)).toBeNull()
})

it('names sessions by 256 random bits', () => {
  const names = Array.from({ length: 100 }, newSessionName)
  expect(new Set(names).size).toBe(100)
  expect(Buffer.from(names[0] ?? '', 'base64url')).toHaveLength(32)
})
