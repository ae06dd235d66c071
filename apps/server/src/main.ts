import { EXIT_FOLDER_IN_USE, FolderInUse } from './data-folder-lock.ts'
import { MigrationMismatch } from './db/migrate.ts'
import { DEMO_OFFICES, DEMO_PASSWORD } from './demo/demo-people.ts'
import { describeError } from './describe-error.ts'
import { BadEnvironment, readEnv } from './env.ts'
import { consoleLog } from './log.ts'
import { type RunningServer, startServer } from './start-server.ts'

const EXIT_USAGE = 64
const EXIT_CANNOT_LISTEN = 69
const EXIT_INTERNAL = 70
const EXIT_DATABASE = 78
/** One Ctrl+C reaches the process twice where npm hands it on. Only a later one asks for an end without closing. */
const IMPATIENCE_MS = 2_000

/** Says why the server did not start, in words for the person who started it, and gives the exit status. */
const explain = (error: unknown): number => {
  if (error instanceof FolderInUse) return say(error.message, EXIT_FOLDER_IN_USE)
  if (error instanceof BadEnvironment) return say(`A setting cannot be used.\n${error.message}`, EXIT_USAGE)
  if (error instanceof MigrationMismatch) return say(error.message, EXIT_DATABASE)
  if (error instanceof Error && 'code' in error && (error.code === 'EADDRINUSE' || error.code === 'EACCES'))
    return say(`The server cannot listen: ${error.message}. Choose another port with PORT=….`, EXIT_CANNOT_LISTEN)
  return say(describeError(error), EXIT_INTERNAL)
}

const say = (text: string, status: number): number => {
  consoleLog.error(text)
  return status
}

const signIns = (): string =>
  DEMO_OFFICES.flatMap(({ name, people }) => [
    `  ${name}`,
    ...people.map(
      ({ email, roles, administrator }) =>
        `    ${email.padEnd(26)} ${administrator ? 'administrator' : roles.join(', ')}`,
    ),
  ]).join('\n')

const stopOnSignals = (server: RunningServer): void => {
  let stoppingSince: number | null = null
  for (const signal of ['SIGINT', 'SIGTERM'] as const)
    process.on(signal, () => {
      const now = Date.now()
      if (stoppingSince !== null) {
        if (now - stoppingSince > IMPATIENCE_MS) process.exit(130)
        return
      }
      stoppingSince = now
      consoleLog.info('Closing the database …')
      void server
        .close()
        .then(() => consoleLog.info('Closed.'))
        .then(
          () => process.exit(0),
          (error: unknown) => process.exit(explain(error)),
        )
    })
}

try {
  const server = await startServer(readEnv(process.env), consoleLog)
  stopOnSignals(server)
  consoleLog.info(
    `\nColdfill is at ${server.address}\n\nDemo sign-ins (password of all: ${DEMO_PASSWORD})\n${signIns()}\n\nCtrl+C closes it.`,
  )
} catch (error) {
  process.exitCode = explain(error)
}
