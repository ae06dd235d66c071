import { randomBytes } from 'node:crypto'
import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/** The secret that signs sessions: from the settings, or made once and kept in the data folder, readable by its owner alone. */
export const sessionSecret = (given: string | undefined, folder: string): string => {
  if (given !== undefined) return given
  const file = join(folder, 'session-secret')
  try {
    const kept = readFileSync(file, 'utf8').trim()
    if (kept.length >= 32) return kept
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error
  }
  const made = randomBytes(48).toString('base64url')
  writeFileSync(file, made, { mode: 0o600 })
  return made
}
