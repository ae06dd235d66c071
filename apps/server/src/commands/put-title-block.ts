import { and, eq, isNull } from 'drizzle-orm'
import { USUAL_CAPTIONS } from '@coldfill/contract'
import type { Logo } from '@coldfill/documents'
import type { Tx } from '../db/client.ts'
import { officeLogos, titleBlocks } from '../db/schema/index.ts'
import { withTx } from '../db/with-tx.ts'
import type { Deps } from '../deps.ts'
import { notFound } from '../errors.ts'
import { sha256 } from '../review/content-hash.ts'
import type { Principal } from '../sign-in/sessions.ts'
import { recordEvent } from './record-event.ts'

type Row = typeof titleBlocks.$inferSelect
type Content = Pick<Row, 'name' | 'lines' | 'prepared' | 'checked' | 'approved' | 'paper' | 'logoId'>
type Writer = Pick<Deps, 'db' | 'clock'>
type By = Pick<Principal, 'name' | 'office'>

/** What an office prints that has never said otherwise. */
const usual = (office: string): Content => ({
  name: office,
  lines: [],
  ...USUAL_CAPTIONS,
  paper: 'by units',
  logoId: null,
})

/** Ends the title block in force and puts one in its place that differs from it by `change`. Issued files keep theirs. */
const replaceTitleBlock = async (
  tx: Tx,
  by: By,
  at: Date,
  change: (before: Content) => Partial<Content>,
): Promise<void> => {
  const [ended] = await tx
    .update(titleBlocks)
    .set({ endedAt: at })
    .where(and(eq(titleBlocks.officeId, by.office.id), isNull(titleBlocks.endedAt)))
    .returning()
  const before: Content = ended ?? usual(by.office.name)
  const { name, lines, prepared, checked, approved, paper, logoId } = { ...before, ...change(before) }
  await tx.insert(titleBlocks).values({
    officeId: by.office.id,
    name,
    lines,
    prepared,
    checked,
    approved,
    paper,
    logoId,
    setAt: at,
    setBy: by.name,
  })
}

/** Changes the texts and the paper. The caller has asked whether the person may. */
export const putTitleBlock = async (deps: Writer, by: By, content: Omit<Content, 'logoId'>): Promise<void> => {
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    await replaceTitleBlock(tx, by, now, () => content)
    await recordEvent(tx, by, now, {
      action: 'title block changed',
      detail: `${[content.name, ...content.lines].join(', ')}; paper ${content.paper}`,
    })
  })
}

/** Stores a logo that was read and puts it into the title block. */
export const putLogo = async (deps: Writer, by: By, fileName: string, logo: Logo): Promise<void> => {
  const now = deps.clock()
  const { data, type, width, height } = logo
  const hash = sha256(data)
  await withTx(deps.db, async (tx) => {
    const [stored] = await tx
      .insert(officeLogos)
      .values({
        officeId: by.office.id,
        fileName,
        type,
        width,
        height,
        sha256: hash,
        content: data,
        uploadedAt: now,
      })
      .returning({ id: officeLogos.id })
    if (!stored) throw new Error('The logo was not written.')
    await replaceTitleBlock(tx, by, now, () => ({ logoId: stored.id }))
    await recordEvent(tx, by, now, {
      action: 'logo uploaded',
      detail: `${fileName}: ${width} × ${height} pixels, content ${hash.slice(0, 12)}`,
    })
  })
}

/** Takes the logo off what is made from now on. @throws {AppError} 404 where there is none */
export const removeLogo = async (deps: Writer, by: By): Promise<void> => {
  const now = deps.clock()
  await withTx(deps.db, async (tx) => {
    await replaceTitleBlock(tx, by, now, ({ logoId }) => {
      if (logoId === null) throw notFound()
      return { logoId: null }
    })
    await recordEvent(tx, by, now, { action: 'logo removed' })
  })
}
