import { describeError } from './describe-error.ts'
import type { Log } from './log.ts'

/** Work that goes on behind requests, one round at a time. */
export interface Rounds {
  /** Has a round begin, or another follow the one that runs. Returns at once. */
  wake(): void
  /** Resolves when no round runs. */
  idle(): Promise<void>
  /** Lets no further round begin and waits for the one that runs. */
  close(): Promise<void>
}

/** `round` looks for work and does it; it stops early where `closed()` says so. An error ends the round and is logged. */
export const createRounds = (name: string, log: Log, round: (closed: () => boolean) => Promise<void>): Rounds => {
  const state: { running: Promise<void> | null; again: boolean; closed: boolean } = {
    running: null,
    again: false,
    closed: false,
  }
  const closed = (): boolean => state.closed
  const run = async (): Promise<void> => {
    try {
      while (state.again && !state.closed) {
        state.again = false
        await round(closed)
      }
    } catch (error) {
      log.error(`${name}: ${describeError(error)}`)
    } finally {
      state.running = null
    }
  }
  const idle = async (): Promise<void> => {
    while (state.running) await state.running
  }
  return {
    wake: () => {
      if (state.closed) return
      state.again = true
      state.running ??= run()
    },
    idle,
    close: async () => {
      state.closed = true
      await idle()
    },
  }
}
