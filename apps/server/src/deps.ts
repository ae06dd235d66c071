import type { Clock } from './clock.ts'
import type { Database } from './db/client.ts'
import type { FileMaker } from './documents/file-maker.ts'
import type { Log } from './log.ts'
import type { Postman } from './mail/postman.ts'
import type { Passwords } from './sign-in/passwords.ts'
import type { SessionTokens } from './sign-in/session-token.ts'
import type { SizingService } from './sizing-service.ts'

/** What the application works with. `createApp` gets it whole, so that a test can put in its own clock or database. */
export interface Deps {
  readonly db: Database
  readonly clock: Clock
  readonly log: Log
  readonly passwords: Passwords
  readonly tokens: SessionTokens
  readonly sizing: SizingService
  readonly fileMaker: FileMaker
  readonly postman: Postman
  /** Folder of the built web app. */
  readonly webFolder: string
  /** Folder of the example buildings. */
  readonly examplesFolder: string
  readonly trustProxy: number
  /** Address that mails link to, without a slash at its end. Known once the server listens. */
  readonly address: () => string
}
