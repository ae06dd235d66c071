import type { AuditTrail, Outbox, People } from '@coldfill/contract'
import { Router } from 'express'
import { z } from 'zod'
import { recordEvent } from '../../commands/record-event.ts'
import type { Deps } from '../../deps.ts'
import { notFound } from '../../errors.ts'
import { requireAdministrator } from '../../middleware/require-administrator.ts'
import { principalIn } from '../../middleware/require-user.ts'
import { presentEvents, presentMail, presentPeople } from './office.presenter.ts'
import { officeEvents, officeMails, officeMemberships, officePeople, requeueMail } from './office.queries.ts'

/** The office's own affairs, for its administrator. For the others there is nothing here. */
export const officeRouter = (deps: Deps): Router => {
  const { db, clock, postman } = deps
  const router = Router()
  router.use(requireAdministrator)
  router.get('/outbox', async (_req, res) => {
    const rows = await officeMails(db, principalIn(res).office.id)
    res.json({ mails: rows.map(presentMail) } satisfies Outbox)
  })
  router.post('/outbox/:id/resend', async (req, res) => {
    const principal = principalIn(res)
    const id = z.uuid().safeParse(req.params.id)
    if (!id.success || !(await requeueMail(db, principal.office.id, id.data))) throw notFound()
    await recordEvent(db, principal, clock(), { action: 'mail sent again', detail: id.data })
    postman.wake()
    await postman.idle()
    const mail = (await officeMails(db, principal.office.id)).find((row) => row.mail.id === id.data)
    if (!mail) throw notFound()
    res.json(presentMail(mail))
  })
  router.get('/people', async (_req, res) => {
    const { office } = principalIn(res)
    const people = presentPeople(await officePeople(db, office.id), await officeMemberships(db, office.id))
    res.json({ people } satisfies People)
  })
  router.get('/audit', async (_req, res) => {
    const events = presentEvents(await officeEvents(db, principalIn(res).office.id))
    res.json({ events } satisfies AuditTrail)
  })
  return router
}
