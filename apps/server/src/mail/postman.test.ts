import { createServer, type Server } from 'node:net'
import type { AddressInfo } from 'node:net'
import type { PGlite } from '@electric-sql/pglite'
import { afterAll, afterEach, beforeAll, expect, it } from 'vitest'
import { type Database, databaseOver } from '../db/client.ts'
import { mails, offices } from '../db/schema/index.ts'
import { migratedDatabase } from '../testing/migrated-template.ts'
import { createPostman, smtpCarrier } from './postman.ts'

interface Received {
  readonly from: string
  readonly to: string[]
  readonly data: string
}

/** A mail server that takes everything, by the commands of RFC 5321, on a port of its own. */
const listen = async (received: Received[]): Promise<Server> => {
  const server = createServer((socket) => {
    let from = ''
    let to: string[] = []
    let data: string | null = null
    let rest = ''
    socket.write('220 test\r\n')
    const line = (text: string): void => {
      if (data !== null) {
        if (text === '.') {
          received.push({ from, to, data })
          data = null
          to = []
          socket.write('250 taken\r\n')
        } else data += `${text.replace(/^\./, '')}\n`
        return
      }
      const address = /<([^>]*)>/.exec(text)?.[1] ?? ''
      if (text.startsWith('MAIL')) from = address
      if (text.startsWith('RCPT')) to.push(address)
      if (text === 'DATA') {
        data = ''
        socket.write('354 go on\r\n')
      } else if (text === 'QUIT') socket.end('221 bye\r\n')
      else socket.write('250 fine\r\n')
    }
    socket.on('data', (chunk) => {
      const lines = (rest + String(chunk)).split('\r\n')
      rest = lines.pop() ?? ''
      for (const text of lines) line(text)
    })
    socket.on('error', () => undefined)
  })
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  return server
}

let client: PGlite
let db: Database
let officeId: string
const servers: Server[] = []

beforeAll(async () => {
  client = await migratedDatabase()
  db = databaseOver(client)
  const [office] = await db.insert(offices).values({ name: 'An office' }).returning()
  officeId = office?.id ?? ''
})
afterAll(() => client.close())
afterEach(async () => {
  for (const server of servers.splice(0)) server.close()
  await db.delete(mails)
})

const queue = (toEmail: string, subject = 'Subject'): PromiseLike<unknown> =>
  db.insert(mails).values({
    officeId,
    event: 'review asked',
    toName: 'Otto, Vane',
    toEmail,
    subject,
    text: 'Please review.',
    html: '<p>Please review.</p>',
    state: 'queued',
    createdAt: new Date(),
  })

const postmanFor = (carrier: Parameters<typeof createPostman>[0]['carrier']) =>
  createPostman({ db, clock: () => new Date(), log: { info: () => undefined, error: () => undefined }, carrier })

it('sends a queued mail through SMTP as text and HTML, and says so in the outbox', async () => {
  const received: Received[] = []
  const server = await listen(received)
  servers.push(server)
  const { port } = server.address() as AddressInfo
  const postman = postmanFor(smtpCarrier(`smtp://127.0.0.1:${port}`, 'office@test.example'))
  await queue('otto@test.example', 'Two\r\nBcc: thief@test.example')
  postman.wake()
  await postman.idle()
  expect(await db.select().from(mails)).toMatchObject([{ state: 'sent', attempts: 1, problem: null }])
  // One addressee, whatever stands in the name or the subject.
  expect(received).toMatchObject([{ from: 'office@test.example', to: ['otto@test.example'] }])
  expect(received[0]?.data).toContain('text/plain')
  expect(received[0]?.data).toContain('<p>Please review.</p>')
  expect(received[0]?.data).not.toMatch(/^Bcc:/im)
  await postman.close()
})

it('keeps a mail that cannot be sent, tries it five times and then says that it failed', async () => {
  const server = await listen([])
  const { port } = server.address() as AddressInfo
  await new Promise((resolve) => server.close(resolve))
  const postman = postmanFor(smtpCarrier(`smtp://127.0.0.1:${port}`, 'office@test.example'))
  await queue('otto@test.example')
  for (let attempt = 1; attempt <= 5; attempt++) {
    postman.wake()
    await postman.idle()
    const [mail] = await db.select().from(mails)
    expect(mail).toMatchObject({ attempts: attempt, state: attempt < 5 ? 'queued' : 'failed' })
    expect(mail?.problem).toContain('ECONNREFUSED')
  }
  await postman.close()
})

it('keeps mail in the outbox where no mail server is set up', async () => {
  const postman = postmanFor(null)
  await queue('otto@test.example')
  postman.wake()
  await postman.idle()
  expect(await db.select().from(mails)).toMatchObject([{ state: 'kept', sentAt: null }])
  await postman.close()
})
