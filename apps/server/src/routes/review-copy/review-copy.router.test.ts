import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { ReviewCopyAnswer } from '@coldfill/contract'
import { reviewCopies } from '../../db/schema/index.ts'
import { sha256 } from '../../review/content-hash.ts'
import { download, partOf, wordsOf } from '../../testing/documents.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

/** One review copy after the other of the first issue; the steps follow each other. */
let t: TestApp
let team: Team
let at: string

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
  at = `${team.at}/revisions/-/review-copy`
})
afterAll(() => t.close())

const copy = async () => ReviewCopyAnswer.parse((await team.reviewer.get(at).expect(200)).body).copy

/** Authors and words of the comments, in order. */
const comments = (docx: Uint8Array): string[] =>
  (partOf(docx, 'word/comments.xml').match(/<w:comment .*?<\/w:comment>/gs) ?? []).map(
    (comment) => `${/w:author="([^"]*)"/.exec(comment)?.[1]}: ${comment.replace(/<[^>]+>/g, '')}`,
  )

it('is there only once it was asked for, of a revision that exists', async () => {
  await team.reviewer.get(at).expect(404)
  await team.issue()
  expect(await copy()).toBeNull()
  await team.reviewer.get(`${at}/file`).expect(404)
  await team.reviewer.post(`${team.at}/revisions/Q/review-copy`).expect(404)
})

it('has each redline as a comment at its row with the answers, pending ones left out', async () => {
  const revision = await team.revision('-')
  const write = (text: string) =>
    team.reviewer
      .post(`${team.at}/redlines`)
      .send({ anchor: { type: 'row', mark: 'ET-1' }, text })
      .expect(201)
  await write('Why a bladder?')
  await team.review(revision, 'revise', 'See the redline.')
  await write('Still pending.')
  await team.consultant.post(`${team.at}/redlines/1/replies`).send({ text: 'It can be replaced.' }).expect(201)
  await team.reviewer.post(`${team.at}/redlines/1/close`).send({ comment: 'Seen.' }).expect(200)

  const asked = ReviewCopyAnswer.parse((await team.consultant.post(at).expect(202)).body).copy
  expect(asked).toMatchObject({ state: 'preparing', askedBy: 'Runa Sedge', file: null })
  await t.settle()
  const ready = await copy()
  expect(ready).toMatchObject({ state: 'ready', file: { name: 'T-1-review-copy.docx', redlines: 1 } })
  const bytes = await download(team.reviewer, ready?.file?.href ?? '')
  expect(sha256(bytes)).toBe(ready?.file?.sha256)
  expect(comments(bytes)).toEqual([
    expect.stringMatching(/^Otto Vane: Why a bladder\?/),
    'Runa Sedge: It can be replaced.',
    'Otto Vane: Seen. Closed.',
  ])
  // The issue is dated by itself, not by the moment of the copy.
  expect(wordsOf(bytes)).toContain(revision.issuedAt.slice(0, 10))
})

it('asked for again has the redlines of that moment', async () => {
  await team.reviewer.post(`${team.at}/redlines/1/reopen`).send({ comment: 'After all not.' }).expect(200)
  const before = await copy()
  await team.reviewer.post(at).expect(202)
  // Asking twice makes one.
  await team.consultant.post(at).expect(202)
  await t.settle()
  const after = await copy()
  expect(after?.askedBy).toBe('Otto Vane')
  expect(after?.askedAt).not.toBe(before?.askedAt)
  expect(comments(await download(team.reviewer, after?.file?.href ?? '')).at(-1)).toBe(
    'Otto Vane: After all not. Reopened.',
  )
})

it('says why it could not be made, and is made when asked again', async () => {
  const revision = await team.revision('-')
  await t.deps.db
    .update(reviewCopies)
    .set({ attempts: 3, name: null, size: null, sha256: null, content: null })
    .where(eq(reviewCopies.revisionId, revision.id))
  t.deps.fileMaker.wake()
  await t.settle()
  expect(await copy()).toMatchObject({ state: 'failed', problem: expect.stringMatching(/several times/) as string })
  await team.reviewer.post(at).expect(202)
  await t.settle()
  expect((await copy())?.state).toBe('ready')
})

it('is found again after a stop', async () => {
  const revision = await team.revision('-')
  await t.deps.db
    .update(reviewCopies)
    .set({ attempts: 1, name: null, size: null, sha256: null, content: null })
    .where(eq(reviewCopies.revisionId, revision.id))
  expect((await copy())?.state).toBe('preparing')
  t.deps.fileMaker.wake()
  await t.settle()
  expect((await copy())?.state).toBe('ready')
})

it('is not handed out where the stored bytes were altered, and never to a contractor', async () => {
  await team.contractor.get(at).expect(404)
  await team.contractor.post(at).expect(404)
  await team.contractor.get(`${at}/file`).expect(404)
  const revision = await team.revision('-')
  await t.deps.db
    .update(reviewCopies)
    .set({ content: new Uint8Array([1]) })
    .where(eq(reviewCopies.revisionId, revision.id))
  expect((await team.reviewer.get(`${at}/file`).expect(500)).body).toMatchObject({ code: 'file_damaged' })
})
