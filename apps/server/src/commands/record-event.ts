import type { Tx } from '../db/client.ts'
import { auditEvents } from '../db/schema/index.ts'
import type { Principal } from '../sign-in/sessions.ts'

/** Writes one line of the audit trail, in the transaction of what it tells. */
export const recordEvent = async (
  tx: Pick<Tx, 'insert'>,
  principal: Pick<Principal, 'name' | 'office'>,
  at: Date,
  event: { action: string; project?: string; detail?: string },
): Promise<void> => {
  await tx.insert(auditEvents).values({
    officeId: principal.office.id,
    at,
    who: principal.name,
    action: event.action,
    project: event.project ?? null,
    detail: event.detail ?? '',
  })
}
