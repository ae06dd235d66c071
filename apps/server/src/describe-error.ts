/**
 * The text of a database error holds the statement and its values, so that neither it nor its cause is ever written down; the
 * code and the constraint are.
 */
export const describeError = (error: unknown): string => {
  if (!(error instanceof Error)) return 'a value that is no error was thrown'
  if (error.name === 'DrizzleQueryError' || error.message.startsWith('Failed query')) {
    const cause: object = error.cause instanceof Error ? error.cause : {}
    const code = 'code' in cause && typeof cause.code === 'string' ? cause.code : 'unknown'
    return `database error ${code}${'constraint' in cause && typeof cause.constraint === 'string' ? ` (${cause.constraint})` : ''}`
  }
  return error.stack ?? error.message
}
