import { type OfficeTitleBlock, PutLogoRequest, PutTitleBlockRequest, USUAL_CAPTIONS } from '@coldfill/contract'
import { and, eq, getTableColumns, isNull, sql } from 'drizzle-orm'
import { json, Router } from 'express'
import { putLogo, putTitleBlock, removeLogo } from '../../commands/put-title-block.ts'
import { officeLogos, titleBlocks } from '../../db/schema/index.ts'
import type { Deps } from '../../deps.ts'
import { notFound } from '../../errors.ts'
import { requireAdministrator } from '../../middleware/require-administrator.ts'
import { principalIn } from '../../middleware/require-user.ts'
import { parseBody } from '../../parse-request.ts'
import type { Principal } from '../../sign-in/sessions.ts'
import { readLogo } from '../../title-block/read-logo.ts'

/** A logo of LOGO_LIMIT bytes in base64, with some room to be told so by name. */
const BODY_LIMIT = '3mb'

const TYPES = { png: 'image/png', jpg: 'image/jpeg' } as const

const { content: _content, ...lightLogo } = getTableColumns(officeLogos)

/** What the office prints on its documents, for its administrator. Reads its own bodies, which are larger than those of others. */
export const titleBlockRouter = (deps: Deps): Router => {
  const { db } = deps
  const inForce = (officeId: string) => and(eq(titleBlocks.officeId, officeId), isNull(titleBlocks.endedAt))
  const read = async ({ office }: Principal): Promise<OfficeTitleBlock> => {
    const [row] = await db
      .select({
        block: titleBlocks,
        logo: lightLogo,
        size: sql<number | null>`octet_length(${officeLogos.content})`,
      })
      .from(titleBlocks)
      .leftJoin(officeLogos, eq(officeLogos.id, titleBlocks.logoId))
      .where(inForce(office.id))
    if (!row)
      return {
        name: office.name,
        lines: [],
        captions: USUAL_CAPTIONS,
        paper: 'by units',
        logo: null,
        changed: null,
      }
    const { name, lines, prepared, checked, approved, paper, setAt, setBy } = row.block
    return {
      name,
      lines,
      captions: { prepared, checked, approved },
      paper,
      logo: row.logo && {
        fileName: row.logo.fileName,
        type: row.logo.type,
        width: row.logo.width,
        height: row.logo.height,
        size: row.size ?? 0,
        sha256: row.logo.sha256,
        href: `/api/office/title-block/logo?content=${row.logo.sha256.slice(0, 16)}`,
      },
      changed: { at: setAt.toISOString(), by: setBy },
    }
  }
  return Router()
    .use(requireAdministrator, json({ limit: BODY_LIMIT }))
    .get('/', async (_req, res) => {
      res.json(await read(principalIn(res)))
    })
    .put('/', async (req, res) => {
      const principal = principalIn(res)
      const { captions, ...texts } = parseBody(PutTitleBlockRequest, req)
      await putTitleBlock(deps, principal, { ...texts, ...captions })
      res.json(await read(principal))
    })
    .get('/logo', async (_req, res) => {
      const [row] = await db
        .select({ logo: officeLogos })
        .from(titleBlocks)
        .innerJoin(officeLogos, eq(officeLogos.id, titleBlocks.logoId))
        .where(inForce(principalIn(res).office.id))
      if (!row) throw notFound()
      res.type(TYPES[row.logo.type]).send(Buffer.from(row.logo.content))
    })
    .put('/logo', async (req, res) => {
      const principal = principalIn(res)
      const { fileName, content } = parseBody(PutLogoRequest, req)
      await putLogo(deps, principal, fileName, readLogo(Buffer.from(content, 'base64')))
      res.json(await read(principal))
    })
    .delete('/logo', async (_req, res) => {
      await removeLogo(deps, principalIn(res))
      res.status(204).end()
    })
}
