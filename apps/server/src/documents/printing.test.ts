import { spawnSync } from 'node:child_process'
import { chmodSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Handover, type Revision } from '@coldfill/contract'
import { sha256 } from '../review/content-hash.ts'
import { revisionFiles, makings } from '../db/schema/index.ts'
import { download, partOf } from '../testing/documents.ts'
import { createTeam } from '../testing/team.ts'
import { createTestApp } from '../testing/test-app.ts'

const hasOffice = spawnSync('soffice', ['--version'], { timeout: 60_000 }).status === 0
const leftOut = hasOffice ? '' : ' (left out: LibreOffice is not installed)'

/** Title and page of each entry of the contents list. */
const contents = (docx: Uint8Array): (readonly [string, string | undefined])[] =>
  (partOf(docx, 'word/document.xml').match(/<w:p>.*?<\/w:p>/gs) ?? [])
    .filter((paragraph) => /w:pStyle w:val="TOC[12]"/.test(paragraph))
    .map((paragraph) => {
      const [title = '', page] = [...paragraph.matchAll(/<w:t [^>]*>([^<]*)</g)].map(([, words = '']) => words)
      return [title, page] as const
    })

/** Pages by the page tree, and the page of each title of the outline, both uncompressed in what LibreOffice writes. */
const outline = (pdf: Buffer): Map<string, number> => {
  const text = pdf.toString('latin1')
  const kids = /\/Type\s*\/Pages\b[^>]*?\/Kids\s*\[([^\]]*)\]/s.exec(text)?.[1] ?? ''
  const pages = [...kids.matchAll(/(\d+)\s+0\s+R/g)].map(([, object]) => object)
  return new Map(
    [...text.matchAll(/\/Title<FEFF([0-9A-F]+)>\s*\/Dest\[(\d+) 0 R/g)].map(([, title = '', object]) => [
      Buffer.from(title, 'hex').swap16().toString('utf16le').replace(/\s+/g, ' '),
      pages.indexOf(object) + 1,
    ]),
  )
}

it.skipIf(!hasOffice)(`an issue has page numbers and a PDF of the same pages${leftOut}`, async () => {
  const t = await createTestApp({ office: 'soffice' })
  try {
    const team = await createTeam(t)
    const issued = await team.issue()
    expect(issued.files.map(({ kind }) => kind).toSorted()).toEqual(['pdf', 'schedule', 'submittal'])
    expect(issued.sets).toMatchObject([{ noPages: null, noPdf: null }])
    const fileOf = (revision: Revision, kind: string) => revision.files.find((file) => file.kind === kind)
    const docx = await download(team.reviewer, fileOf(issued, 'submittal')?.href ?? '')
    const pdfFile = fileOf(issued, 'pdf')
    expect(pdfFile?.name).toBe('T-1-submittal.pdf')
    const res = await team.reviewer.get(pdfFile?.href ?? '').expect(200)
    expect(res.headers['content-type']).toBe('application/pdf')
    const pdf = await download(team.reviewer, pdfFile?.href ?? '')
    expect(sha256(pdf)).toBe(pdfFile?.sha256)
    const printed = outline(pdf)
    expect(printed.size).toBeGreaterThan(4)
    for (const [title, page] of contents(docx))
      expect([title, page]).toEqual([title, String(printed.get(title.replace(/\s+/g, ' ')))])

    // Made once more from the same order: the same bytes, on one machine.
    await t.deps.db.delete(revisionFiles)
    await t.deps.db
      .insert(makings)
      .values({ revisionId: issued.id, set: 'review', askedBy: team.consultantId, askedAt: new Date(issued.issuedAt) })
    t.deps.fileMaker.wake()
    await t.settle()
    const again = await team.revision('-')
    expect(again.files.map(({ sha256: hash }) => hash).toSorted()).toEqual(
      issued.files.map(({ sha256: hash }) => hash).toSorted(),
    )
  } finally {
    await t.close()
  }
})

describe.skipIf(process.platform === 'win32')('an issue where LibreOffice', () => {
  let folder: string
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), 'coldfill-printing-'))
  })
  afterAll(() => rmSync(folder, { recursive: true }))
  const command = (name: string, lines: string): string => {
    const path = join(folder, name)
    writeFileSync(path, `#!/bin/sh\n[ "$1" = --version ] && exit 0\n${lines}\n`)
    chmodSync(path, 0o755)
    return path
  }

  it.each([
    ['is not installed', () => join(folder, 'nowhere'), 'LibreOffice is not installed on the server.'],
    ['fails', () => command('failing', 'exit 1'), 'LibreOffice made no PDF of the file.'],
  ])('%s is made all the same, and says so to those who read it', async (_, office, why) => {
    const t = await createTestApp({ office: office() })
    try {
      const team = await createTeam(t)
      const issued = await team.issue()
      expect(issued.files.map(({ kind }) => kind).toSorted()).toEqual(['schedule', 'submittal'])
      expect(issued.sets).toMatchObject([{ noPages: why, noPdf: why }])
      const docx = await download(team.reviewer, issued.files.find(({ kind }) => kind === 'submittal')?.href ?? '')
      expect(contents(docx).length).toBeGreaterThan(4)
      for (const [, page] of contents(docx)) expect(page).toBeUndefined()
      await team.review(issued, 'accepted')
      await team.consultant.post(`${team.at}/revisions/-/construction`).send({}).expect(202)
      await t.settle()
      const handover = Handover.parse((await team.contractor.get(`${team.at}/handover`).expect(200)).body)
      expect(handover.current).toMatchObject({ noPdf: why })
      expect(handover.current?.files).toHaveLength(2)
    } finally {
      await t.close()
    }
  })

  it('is at work when the server closes is taken up again at the next start, from its beginning', async () => {
    const mark = join(folder, 'started')
    const t = await createTestApp({ office: command('slow', `touch '${mark}'\nsleep 600`) })
    const team = await createTeam(t)
    await team.consultant.post(`${team.at}/revisions`).send({ purpose: 'review' }).expect(201)
    await expect
      .poll(async () => (await team.revision('-')).making?.name, { timeout: 60_000 })
      .toBe('Laying out the pages')
    const begun = Date.now()
    await t.deps.fileMaker.close()
    // It does not wait for the ten minutes of the command.
    expect(Date.now() - begun).toBeLessThan(20_000)
    const [left] = await t.deps.db.select().from(makings)
    expect(left).toMatchObject({ problem: null, attempts: 0 })
    expect((await team.revision('-')).files).toEqual([])
    await t.close()
  })
})
