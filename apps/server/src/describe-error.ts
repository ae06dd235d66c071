/**
 * The text of a database error holds the statement and its values, so that neither it nor its cause is ever written down; the
 * code and the constraint are.
 */
export const describeError = (error: unknown): string => {
  if (!(error instanceof Error)) return 'a value that is no error was thrown'
  if (error.name === 'DrizzleQueryError' || error.message.startsWith('Failed query')) {
    const { code, constraint } = (error.cause ?? {}) as { code?: unknown; constraint?: unknown }
    return `database error ${String(code ?? 'unknown')}${constraint === undefined ? '' : ` (${String(constraint)})`}`
  }
  return error.stack ?? error.message
}
