import { hash, verify } from '@node-rs/argon2'

/** Argon2id with 64 MiB and 3 passes: about 60 ms of one core. */
const COST = { memoryCost: 64 * 1024, timeCost: 3, parallelism: 1 } as const
const WIDTH = 2

export interface Passwords {
  hash(password: string): Promise<string>
  /** `stored` null is an unknown person: as much work is done, so that the time of the answer tells nothing. */
  matches(stored: string | null, password: string): Promise<boolean>
}

/** Lets `width` pieces of work run at once; the others wait their turn. */
const narrow = (width: number) => {
  let running = 0
  const waiting: (() => void)[] = []
  return async <T>(work: () => Promise<T>): Promise<T> => {
    if (running >= width) await new Promise<void>((resolve) => waiting.push(resolve))
    running += 1
    try {
      return await work()
    } finally {
      running -= 1
      waiting.shift()?.()
    }
  }
}

export const createPasswords = (
  cost: { memoryCost: number; timeCost: number; parallelism: number } = COST,
): Passwords => {
  const inTurn = narrow(WIDTH)
  const hashNow = (password: string): Promise<string> => inTurn(() => hash(password, cost))
  let nobody: Promise<string> | null = null
  return {
    hash: hashNow,
    matches: async (stored, password) => {
      nobody ??= hashNow('nobody signs in with this')
      const against = stored ?? (await nobody)
      const matches = await inTurn(async () => {
        try {
          return await verify(against, password)
        } catch {
          // A stored hash that cannot be read matches nothing.
          return false
        }
      })
      return stored !== null && matches
    },
  }
}
