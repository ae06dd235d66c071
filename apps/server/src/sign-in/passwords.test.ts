import { expect, it } from 'vitest'
import { createPasswords } from './passwords.ts'

it('knows the right password from a wrong one, and stores neither', async () => {
  const passwords = createPasswords()
  const stored = await passwords.hash('a long password')
  // Argon2id with 64 MiB, 3 passes, 1 lane, as the settings of this program say.
  expect(stored).toMatch(/^\$argon2id\$v=19\$m=65536,t=3,p=1\$/)
  expect(stored).not.toContain('a long password')
  expect(await passwords.matches(stored, 'a long password')).toBe(true)
  expect(await passwords.matches(stored, 'another password')).toBe(false)
})

it('matches nothing for an unknown person or a hash that cannot be read', async () => {
  const passwords = createPasswords({ memoryCost: 8, timeCost: 1, parallelism: 1 })
  expect(await passwords.matches(null, 'nobody signs in with this')).toBe(false)
  expect(await passwords.matches('not a hash', 'anything')).toBe(false)
})

it('takes about as long for an unknown person as for a known one', async () => {
  const passwords = createPasswords()
  const stored = await passwords.hash('a long password')
  await passwords.matches(null, 'warm up')
  const time = async (hash: string | null): Promise<number> => {
    const begun = process.hrtime.bigint()
    for (let run = 0; run < 5; run++) await passwords.matches(hash, 'guess')
    return Number(process.hrtime.bigint() - begun)
  }
  const [known, unknown] = [await time(stored), await time(null)]
  // Without the stand-in hash the unknown would be answered some thousand times as fast.
  expect(unknown).toBeGreaterThan(known / 5)
})
