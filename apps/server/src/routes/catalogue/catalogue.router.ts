import { readFile } from 'node:fs/promises'
import { type OfficeCatalogue, PutCatalogueRequest } from '@coldfill/contract'
import { json, Router } from 'express'
import { exampleCatalogueFile } from '../../catalogue/example-catalogue.ts'
import { putCatalogue, removeCatalogue } from '../../commands/put-catalogue.ts'
import type { Deps } from '../../deps.ts'
import { requireAdministrator } from '../../middleware/require-administrator.ts'
import { principalIn } from '../../middleware/require-user.ts'
import { parseBody } from '../../parse-request.ts'
import { presentCatalogue } from './catalogue.presenter.ts'
import { catalogueContent, officeCatalogues } from './catalogue.queries.ts'

/** A file of CATALOGUE_LIMIT bytes in base64, with some room to be told so by name. */
const BODY_LIMIT = '3mb'

/** The vessels that the office chooses from, for its administrator. Reads its own bodies, which are larger than those of others. */
export const catalogueRouter = (deps: Deps): Router => {
  const { db, examplesFolder } = deps
  const read = async (officeId: string): Promise<OfficeCatalogue> => {
    const listed = await officeCatalogues(db, officeId)
    const current = listed.find(({ endedAt }) => endedAt === null)
    return presentCatalogue(
      listed,
      current ? { listed: current, content: await catalogueContent(db, current.id) } : null,
    )
  }
  return Router()
    .use(requireAdministrator, json({ limit: BODY_LIMIT }))
    .get('/', async (_req, res) => {
      res.json(await read(principalIn(res).office.id))
    })
    .put('/', async (req, res) => {
      const principal = principalIn(res)
      const { fileName, content } = parseBody(PutCatalogueRequest, req)
      await putCatalogue(deps, principal, fileName, Buffer.from(content, 'base64'))
      res.json(await read(principal.office.id))
    })
    .delete('/', async (_req, res) => {
      await removeCatalogue(deps, principalIn(res))
      res.status(204).end()
    })
    .get('/example', async (_req, res) => {
      res
        .attachment('vessels.csv')
        .type('text/csv')
        .send(await readFile(exampleCatalogueFile(examplesFolder)))
    })
}
