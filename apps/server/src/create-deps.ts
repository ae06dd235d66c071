import { fileURLToPath } from 'node:url'
import type { Clock } from './clock.ts'
import type { Database } from './db/client.ts'
import type { Deps } from './deps.ts'
import { createFileMaker } from './documents/file-maker.ts'
import { createPrinter } from './documents/printer.ts'
import type { Log } from './log.ts'
import { type Carrier, createPostman } from './mail/postman.ts'
import { createPasswords, type Passwords } from './sign-in/passwords.ts'
import { createSessionTokens } from './sign-in/session-token.ts'
import { createSizingService, type SizingService } from './sizing-service.ts'

const inRepository = (path: string): string => fileURLToPath(new URL(`../../../${path}`, import.meta.url))

export interface Settings {
  readonly db: Database
  readonly clock: Clock
  readonly log: Log
  readonly sessionSecret: string
  /** Null keeps mail in the outbox. */
  readonly carrier: Carrier | null
  readonly address: () => string
  readonly trustProxy?: number
  /** Command that starts LibreOffice, or `none`. */
  readonly office: string
  readonly passwords?: Passwords
  readonly sizing?: SizingService
  readonly webFolder?: string
  readonly examplesFolder?: string
}

/** Puts together what the application works with. */
export const createDeps = (settings: Settings): Deps => {
  const { db, clock, log, address } = settings
  const postman = createPostman({ db, clock, log, carrier: settings.carrier })
  return {
    db,
    clock,
    log,
    address,
    postman,
    passwords: settings.passwords ?? createPasswords(),
    tokens: createSessionTokens(settings.sessionSecret, clock),
    sizing: settings.sizing ?? createSizingService(),
    fileMaker: createFileMaker({ db, log, clock, postman, address, printer: createPrinter(settings.office, log) }),
    webFolder: settings.webFolder ?? inRepository('apps/web/dist'),
    examplesFolder: settings.examplesFolder ?? inRepository('examples'),
    trustProxy: settings.trustProxy ?? 0,
  }
}

/** Ends the work that goes on behind requests. What was under way is found again at the next start. */
export const closeDeps = async (deps: Deps): Promise<void> => {
  await deps.fileMaker.close()
  await deps.postman.close()
  await deps.sizing.close()
}
