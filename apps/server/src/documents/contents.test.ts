import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { ContentsChoice, Revision, RevisionFile } from '@coldfill/contract'
import { fileSets, makings, revisionFiles } from '../db/schema/index.ts'
import { download, partOf, wordsOf } from '../testing/documents.ts'
import { loopSpec } from '../testing/specs.ts'
import { createTeam, type Team } from '../testing/team.ts'
import { createTestApp, type TestApp } from '../testing/test-app.ts'

let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
})
afterAll(() => t.close())

const issue = async (of: Team, contents: ContentsChoice): Promise<Revision> => {
  const issued = await of.consultant.post(`${of.at}/revisions`).send({ purpose: 'review', contents }).expect(201)
  await t.settle()
  const label = (issued.body as Revision).label
  return of.revision(label === '' ? '-' : label)
}
const fileOf = (revision: Revision, kind: RevisionFile['kind'], set: RevisionFile['set'] = 'review'): RevisionFile => {
  const file = revision.files.find((one) => one.kind === kind && one.set === set)
  if (!file) throw new Error(`There is no ${kind} for ${set}. ${t.errors.join('\n')}`)
  return file
}
const submittal = async (of: Team, revision: Revision, set: RevisionFile['set'] = 'review'): Promise<string> =>
  wordsOf(await download(of.consultant, fileOf(revision, 'submittal', set).href))

const redline = async (of: Team, text: string): Promise<void> => {
  await of.reviewer
    .post(`${of.at}/redlines`)
    .send({ anchor: { type: 'cell', mark: 'ET-1', column: 'precharge' }, text, mustAnswer: false })
    .expect(201)
}

describe('contents of the files', () => {
  it('are the units of the spec and no appendix where nothing is chosen', async () => {
    const revision = await issue(team, {})
    expect(revision.sets).toEqual([
      {
        set: 'review',
        contents: { units: 'US', redlines: false, verification: false },
        noPages: 'The server is set to work without LibreOffice.',
        noPdf: 'The server is set to work without LibreOffice.',
      },
    ])
    const words = await submittal(team, revision)
    expect(words).not.toContain('Redlines and answers')
    expect(words).not.toContain('Cases with a known answer')
    expect(words).toContain('psig')
    expect(words).not.toContain('kPa')
  })

  it('are what was chosen: units, verification, and redlines with their answers as of the issue', async () => {
    const own = await createTeam(t, 'T-2')
    const first = await issue(own, {})
    await redline(own, 'Why so low?')
    await own.review(first, 'revise', 'See the redline.')
    await own.consultant.post(`${own.at}/redlines/1/replies`).send({ text: 'The height was mended.' }).expect(201)
    // Pending: the reviewer's own until the review is sent.
    await redline(own, 'A thought of mine alone.')
    await own.save(loopSpec({ number: 'T-2' }).replace('20 ft', '22 ft'))
    const revision = await issue(own, { units: 'SI', redlines: true, verification: true })
    expect(revision.sets).toMatchObject([{ contents: { units: 'SI', redlines: true, verification: true } }])
    const words = await submittal(own, revision)
    expect(words).toContain('kPa')
    expect(words).toContain('Why so low?')
    expect(words).toContain('The height was mended.')
    expect(words).not.toContain('A thought of mine alone.')
    expect(words).toContain('Cases with a known answer, run by the engine of this submittal')
    const heads = partOf(await download(own.consultant, fileOf(revision, 'schedule').href), 'xl/sharedStrings.xml')
    expect(heads).toContain('Precharge (kPa)')
    expect(heads).not.toContain('Precharge (psig)')

    // For construction it is as reviewed where nothing else is chosen.
    await own.review(revision, 'accepted')
    await own.consultant.post(`${own.at}/redlines/1/replies`).send({ text: 'And raised once more.' }).expect(201)
    await own.consultant
      .post(`${own.at}/revisions/A/construction`)
      .send({ contents: { verification: false } })
      .expect(202)
    await t.settle()
    const built = await own.revision('A')
    expect(built.sets.find(({ set }) => set === 'construction')?.contents).toEqual({
      units: 'SI',
      redlines: true,
      verification: false,
    })
    const final = await submittal(own, built, 'construction')
    expect(final).toContain('And raised once more.')
    expect(final).not.toContain('Cases with a known answer')
  })

  it('are refused where they are no contents', async () => {
    const res = await team.consultant
      .post(`${team.at}/revisions`)
      .send({ purpose: 'review', contents: { units: 'metric', maps: true } })
      .expect(400)
    expect((res.body as { errors: object[] }).errors).toHaveLength(2)
  })
})

describe('made again after a stop', () => {
  it('are the same bytes, whatever was written in the meantime', async () => {
    const own = await createTeam(t, 'T-3')
    const first = await issue(own, {})
    await redline(own, 'Why so low?')
    await own.review(first, 'revise', 'See the redline.')
    await own.save(loopSpec({ number: 'T-3' }).replace('20 ft', '22 ft'))
    const issued = await issue(own, { units: 'SI', redlines: true, verification: true })
    const hashes = (revision: Revision) => revision.files.map(({ name, sha256 }) => `${name} ${sha256}`)
    const [made] = await t.deps.db.select().from(fileSets).where(eq(fileSets.revisionId, issued.id))

    await own.consultant.post(`${own.at}/redlines/1/replies`).send({ text: 'Later.' }).expect(201)
    await own.reviewer.post(`${own.at}/redlines/1/close`).send({}).expect(200)
    await own.administrator
      .put('/api/office/title-block')
      .send({
        name: 'Another name',
        lines: [],
        captions: { prepared: 'P', checked: 'C', approved: 'A' },
        paper: 'Letter',
      })
      .expect(200)
    await t.deps.db.delete(revisionFiles).where(eq(revisionFiles.revisionId, issued.id))
    // As it is left by a process that was killed before it stored the files.
    await t.deps.db.insert(makings).values({
      revisionId: issued.id,
      set: 'review',
      stage: 2,
      attempts: 1,
      askedBy: own.consultantId,
      askedAt: new Date(issued.issuedAt),
      units: 'SI',
      withRedlines: true,
      withVerification: true,
      titleBlockId: made?.titleBlockId ?? null,
    })
    t.deps.fileMaker.wake()
    await t.settle()
    expect(hashes(await own.revision('A'))).toEqual(hashes(issued))
  })
})

describe('a redline for the office only', () => {
  it('is in no document, whatever is chosen', async () => {
    const own = await createTeam(t, 'T-4')
    const first = await issue(own, {})
    await redline(own, 'For all to read.')
    await own.review(first, 'revise', 'See the redline.')
    await own.consultant
      .post(`${own.at}/redlines`)
      .send({ anchor: { type: 'row', mark: 'ET-1' }, text: 'The client must not see this.', officeOnly: true })
      .expect(201)
    await own.consultant.post(`${own.at}/redlines/2/replies`).send({ text: 'Nor that.' }).expect(201)
    await own.save(loopSpec({ number: 'T-4' }).replace('20 ft', '22 ft'))
    const revision = await issue(own, { redlines: true })
    const words = await submittal(own, revision)
    expect(words).toContain('For all to read.')
    expect(words).not.toMatch(/must not see|Nor that/)
    await own.reviewer.post(`${own.at}/revisions/A/review-copy`).expect(202)
    await t.settle()
    const copy = await download(own.reviewer, `${own.at}/revisions/A/review-copy/file`)
    expect(partOf(copy, 'word/comments.xml')).toContain('For all to read.')
    for (const part of ['word/comments.xml', 'word/document.xml'])
      expect(partOf(copy, part)).not.toMatch(/must not see|Nor that/)
  })
})
