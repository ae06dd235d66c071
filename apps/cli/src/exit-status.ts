/** Exit statuses of the command, after sysexits.h where it has one. */
export const exitStatus = {
  ok: 0,
  findings: 1,
  usage: 64,
  unreadable: 65,
  noInput: 66,
  internal: 70,
  cannotWrite: 73,
} as const

/** A reason to stop with a status and a message for standard error. */
export class Stop extends Error {
  readonly status: number
  constructor(status: number, message: string) {
    super(message)
    this.name = 'Stop'
    this.status = status
  }
}
