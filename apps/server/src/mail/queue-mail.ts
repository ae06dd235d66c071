import type { Tx } from '../db/client.ts'
import { mails } from '../db/schema/index.ts'
import { composeMail, type MailContent } from './compose-mail.ts'

export interface Addressee {
  readonly name: string
  readonly email: string
}

/**
 * Writes mails to the outbox in the transaction of what they report: both are there, or neither. They go out after it, when the postman
 * is woken.
 */
export const queueMail = async (
  tx: Pick<Tx, 'insert'>,
  about: { officeId: string; projectId: string; address: string; at: Date },
  to: readonly Addressee[],
  content: MailContent,
): Promise<void> => {
  if (to.length === 0) return
  const composed = composeMail(content, about.address)
  await tx.insert(mails).values(
    to.map((person) => ({
      officeId: about.officeId,
      projectId: about.projectId,
      toName: person.name,
      toEmail: person.email,
      ...composed,
      state: 'queued' as const,
      createdAt: about.at,
    })),
  )
}
