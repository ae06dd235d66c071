import { asc, eq } from 'drizzle-orm'
import { createTransport } from 'nodemailer'
import type { Clock } from '../clock.ts'
import type { Database } from '../db/client.ts'
import { mails } from '../db/schema/index.ts'
import type { Log } from '../log.ts'
import { createRounds, type Rounds } from '../rounds.ts'

type MailRow = typeof mails.$inferSelect

/** Sends one mail, or rejects with why it could not. */
export type Carrier = (mail: Pick<MailRow, 'toName' | 'toEmail' | 'subject' | 'text' | 'html'>) => Promise<void>

/** A carrier that speaks SMTP. Content comes from the mail alone: no file and no address is ever read for it. */
export const smtpCarrier = (url: string, from: string): Carrier => {
  const transport = createTransport({
    url,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 20_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  })
  return async (mail) => {
    await transport.sendMail({
      from: { name: 'Coldfill', address: from },
      // An object, not a text: a text is split at commas, and somebody else would get the mail too.
      to: { name: mail.toName, address: mail.toEmail },
      subject: mail.subject,
      text: mail.text,
      html: mail.html,
    })
  }
}

const MOST_ATTEMPTS = 5
const AGAIN_AFTER_MS = 60_000

/** Goes through the queued mails when it is woken. */
export type Postman = Rounds

/** Takes queued mails from the outbox, one after the other. Without a carrier they are kept there, to be read on the Office sheet. */
export const createPostman = ({
  db,
  clock,
  log,
  carrier,
}: {
  db: Database
  clock: Clock
  log: Log
  carrier: Carrier | null
}): Postman => {
  let timer: NodeJS.Timeout | null = null

  const deliver = async (mail: MailRow): Promise<'settled' | 'later'> => {
    const set = (values: Partial<MailRow>) => db.update(mails).set(values).where(eq(mails.id, mail.id))
    if (!carrier) {
      await set({ state: 'kept' })
      return 'settled'
    }
    const attempts = mail.attempts + 1
    try {
      await carrier(mail)
      await set({ state: 'sent', attempts, problem: null, sentAt: clock() })
      return 'settled'
    } catch (error) {
      const problem = error instanceof Error ? error.message.slice(0, 500) : 'unknown'
      const over = attempts >= MOST_ATTEMPTS
      await set({ state: over ? 'failed' : 'queued', attempts, problem })
      return over ? 'settled' : 'later'
    }
  }

  const rounds = createRounds('outbox', log, async (closed) => {
    const queued = await db.select().from(mails).where(eq(mails.state, 'queued')).orderBy(asc(mails.createdAt))
    for (const mail of queued) {
      if (closed()) return
      if ((await deliver(mail)) === 'later') timer ??= setTimeout(wakeAgain, AGAIN_AFTER_MS).unref()
    }
  })

  const wakeAgain = (): void => {
    timer = null
    rounds.wake()
  }

  return {
    ...rounds,
    close: async () => {
      if (timer) clearTimeout(timer)
      await rounds.close()
    },
  }
}
