import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { Revision } from '@coldfill/contract'
import { makings, revisionFiles, revisions } from '../../db/schema/index.ts'
import { contentHash, sha256 } from '../../review/content-hash.ts'
import { binaryBody } from '../../testing/binary-body.ts'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

let t: TestApp
let team: Team
let first: Revision

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
  first = await team.issue()
})
afterAll(() => t.close())

describe('issuing for review', () => {
  it('freezes text, results and engine under one hash', async () => {
    const [row] = await t.deps.db.select().from(revisions).where(eq(revisions.id, first.id))
    expect(row?.specText).toBe(loopSpec({ number: 'T-1' }))
    expect(contentHash(row?.engine ?? '', row?.specText ?? '', row?.resultJson ?? '', null)).toBe(first.contentHash)
    expect(Revision.parse(first)).toEqual(first)
  })

  it('is held by an error in the text, in the words of the gate', async () => {
    const own = await createTeam(t, 'T-50', loopSpec({ relief: '30 gal' }))
    const res = await own.consultant.post(`${own.at}/revisions`).send({ purpose: 'review' }).expect(422)
    expect(res.body).toMatchObject({ code: 'gates_failed', errors: [{ code: 'spec-findings' }] })
    await own.reviewer.get(`${own.at}/results`).expect(404)
  })

  it('is held where nothing is declared and where the text cannot be read', async () => {
    for (const text of ['coldfill: 1\nproject: { number: T-51, title: Empty }\n', 'coldfill: [', '']) {
      const own = await createTeam(t, `T-51-${text.length}`, text)
      const res = await own.consultant.post(`${own.at}/revisions`).send({ purpose: 'review' }).expect(422)
      expect((res.body as { errors: { code: string }[] }).errors.map(({ code }) => code)).toContain('vessels')
    }
  })

  it('lists what is wrong with the body, and answers 401 and 404', async () => {
    const res = await team.consultant
      .post(`${team.at}/revisions`)
      .send({ purpose: 'construction', note: 5 })
      .expect(400)
    expect((res.body as { errors: object[] }).errors).toHaveLength(2)
    await t.anonymous().post(`${team.at}/revisions`).send({ purpose: 'review' }).expect(401)
    await team.stranger.post(`${team.at}/revisions`).send({ purpose: 'review' }).expect(404)
  })
})

describe('files', () => {
  it('come with their hash as ETag and are not sent again to one who has them', async () => {
    for (const file of first.files) {
      const res = await team.reviewer.get(file.href).buffer(true).parse(binaryBody).expect(200)
      expect(sha256(res.body as Buffer)).toBe(file.sha256)
      expect((res.body as Buffer).byteLength).toBe(file.size)
      expect(res.headers['cache-control']).toBe('private, no-cache')
      await team.reviewer.get(file.href).set('If-None-Match', `"${file.sha256}"`).expect(304)
    }
  })

  it('are the same bytes when they are made again from the same revision', async () => {
    const own = await createTeam(t, 'T-52')
    const issued = await own.issue()
    const bytes = (revision: Revision) => revision.files.map(({ name, sha256: hash }) => [name, hash])
    await t.deps.db.delete(revisionFiles).where(eq(revisionFiles.revisionId, issued.id))
    await t.deps.db
      .insert(makings)
      .values({ revisionId: issued.id, set: 'review', askedBy: own.consultantId, askedAt: new Date(issued.issuedAt) })
    t.deps.fileMaker.wake()
    await t.settle()
    expect(bytes(await own.revision('-'))).toEqual(bytes(issued))
  })

  it('are not handed out where the stored bytes were altered', async () => {
    const own = await createTeam(t, 'T-53')
    const issued = await own.issue()
    await t.deps.db
      .update(revisionFiles)
      .set({ content: new Uint8Array([1, 2, 3]) })
      .where(eq(revisionFiles.revisionId, issued.id))
    const res = await own.reviewer.get(issued.files[0]?.href ?? '').expect(500)
    expect(res.body).toMatchObject({ code: 'file_damaged' })
  })

  it('answer 404 under names that are none', async () => {
    for (const name of ['nothing.xlsx', '..%2F..%2Fpackage.json', '%00'])
      await team.reviewer.get(`${team.at}/revisions/-/files/${name}`).expect(404)
  })
})

describe('files that could not be made', () => {
  it('say so, keep the revision, and are tried again when asked', async () => {
    const own = await createTeam(t, 'T-54')
    const issued = await own.issue()
    await t.deps.db.delete(revisionFiles).where(eq(revisionFiles.revisionId, issued.id))
    // As a process leaves it that was killed in the middle each time.
    await t.deps.db
      .insert(makings)
      .values({ revisionId: issued.id, set: 'review', attempts: 3, askedBy: own.consultantId, askedAt: new Date() })
    t.deps.fileMaker.wake()
    await t.settle()
    const stuck = await own.revision('-')
    expect(stuck.making?.problem).toMatch(/several times/)
    expect(stuck.contentHash).toBe(issued.contentHash)
    await own.reviewer.post(`${own.at}/revisions/-/files`).expect(403)
    await own.consultant.post(`${own.at}/revisions/-/files`).expect(202)
    await t.settle()
    expect(await own.revision('-')).toMatchObject({
      making: null,
      files: [{ kind: 'schedule' }, { kind: 'submittal' }],
    })
    await own.consultant.post(`${own.at}/revisions/-/files`).expect(409)
  })
})

describe('a disposition', () => {
  it('lists what is wrong with it', async () => {
    const res = await team.reviewer.post(`${team.at}/revisions/-/reviews`).send({ outcome: 'fine' }).expect(400)
    const { errors } = res.body as { errors: { pointer: string }[] }
    expect(errors.map(({ pointer }) => pointer).toSorted()).toEqual(['/contentHash', '/outcome'])
  })

  it('can be set again: the last word of a reviewer counts', async () => {
    const own = await createTeam(t, 'T-55')
    const issued = await own.issue()
    await own.review(issued, 'rejected', 'Wrong building.')
    expect((await own.revision('-')).state).toBe('rejected')
    await own.review(issued, 'accepted_noted', 'Right after all.')
    const again = await own.revision('-')
    expect(again.state).toBe('accepted')
    expect(again.dispositions).toMatchObject([{ outcome: 'accepted_noted', reason: 'Right after all.', stale: false }])
  })

  it('is stale the moment other content is issued, and fresh again with the old content', async () => {
    const own = await createTeam(t, 'T-56')
    const issued = await own.issue()
    await own.review(issued, 'accepted')
    const text = loopSpec({ number: 'T-56' })
    await own.save(text.replace('500 gal', '501 gal'))
    expect(await own.issue()).toMatchObject({
      label: 'A',
      state: 'in review',
      dispositions: [{ stale: true, revision: '' }],
    })
    await own.save(text)
    expect(await own.issue()).toMatchObject({
      label: 'B',
      state: 'accepted',
      contentHash: issued.contentHash,
      dispositions: [{ stale: false, revision: '' }],
    })
  })

  it('of each required reviewer is needed', async () => {
    const own = await createTeam(t, 'T-57')
    const people = (await own.administrator.get('/api/office/people')).body as {
      people: { id: string; name: string }[]
    }
    const ada = people.people.find(({ name }) => name === 'Ada Brook')
    await own.administrator
      .put(`${own.at}/members/${ada?.id}`)
      .send({ roles: ['reviewer'], requiredReviewer: true })
      .expect(200)
    const issued = await own.issue()
    await own.review(issued, 'accepted')
    expect((await own.revision('-')).state).toBe('in review')
    const held = await own.consultant.post(`${own.at}/revisions/-/construction`).send({}).expect(422)
    expect((held.body as { errors: object[] }).errors).toMatchObject([{ code: 'disposition-given' }])
  })
})

describe('issuing for construction', () => {
  it('refuses a revision that another has taken the place of', async () => {
    const own = await createTeam(t, 'T-58')
    await own.review(await own.issue(), 'accepted')
    await own.save(loopSpec({ number: 'T-58', relief: '50 psi' }))
    await own.issue()
    const res = await own.consultant.post(`${own.at}/revisions/-/construction`).send({}).expect(409)
    expect(res.body).toMatchObject({ code: 'not_newest' })
  })

  it('needs a reason for an override, and records none where nothing was overridden', async () => {
    const own = await createTeam(t, 'T-59')
    await own.review(await own.issue(), 'accepted')
    await own.consultant
      .post(`${own.at}/revisions/-/construction`)
      .send({ override: { reason: '' } })
      .expect(400)
    await own.consultant
      .post(`${own.at}/revisions/-/construction`)
      .send({ override: { reason: 'In case.' } })
      .expect(202)
    await t.settle()
    expect((await own.revision('-')).constructionIssue).toMatchObject({ override: null })
    const again = await own.consultant.post(`${own.at}/revisions/-/construction`).send({}).expect(403)
    expect(again.body).toMatchObject({ code: 'not_allowed' })
  })

  it('is called off where a gate closes while the files are being made', async () => {
    const own = await createTeam(t, 'T-60')
    const issued = await own.issue()
    await own.review(issued, 'accepted')
    await own.consultant.post(`${own.at}/revisions/-/construction`).send({}).expect(202)
    await own.reviewer
      .post(`${own.at}/revisions/-/reviews`)
      .send({ outcome: 'revise', reason: 'Wait.', contentHash: issued.contentHash })
      .expect(201)
    await t.settle()
    const held = await own.revision('-')
    expect(held).toMatchObject({ state: 'revise', constructionIssue: null, making: { set: 'construction' } })
    expect(held.making?.problem).toMatch(/gate closed/)
    expect(held.files.every(({ set }) => set === 'review')).toBe(true)
    // After the reviewer's yes it can be asked for once more.
    await own.review(issued, 'accepted')
    await own.consultant.post(`${own.at}/revisions/-/construction`).send({}).expect(202)
    await t.settle()
    expect(await own.revision('-')).toMatchObject({ state: 'issued for construction', making: null })
  })

  it('is held by an error finding of the frozen content', async () => {
    const own = await createTeam(t, 'T-61', loopSpec({ number: 'T-61', relief: '5 psi' }))
    await own.review(await own.issue(), 'accepted')
    const res = await own.consultant.post(`${own.at}/revisions/-/construction`).send({}).expect(422)
    expect((res.body as { errors: object[] }).errors).toMatchObject([{ code: 'error-findings' }])
  })
})

describe('withdrawing', () => {
  it('needs a reason, is open to the administrator, and tells the members', async () => {
    const own = await createTeam(t, 'T-62')
    await own.issue()
    await own.administrator.post(`${own.at}/revisions/-/withdraw`).send({}).expect(400)
    const res = await own.administrator
      .post(`${own.at}/revisions/-/withdraw`)
      .send({ reason: 'Wrong project.' })
      .expect(200)
    expect(res.body).toMatchObject({
      state: 'withdrawn',
      withdrawal: { by: { name: 'Ada Brook' }, reason: 'Wrong project.' },
    })
    await t.settle()
    const { mails } = (await own.administrator.get('/api/office/outbox')).body as {
      mails: { event: string; to: { name: string } }[]
    }
    // The contractor never heard of it, so that they are not told either.
    expect(
      mails
        .filter(({ event }) => event === 'withdrawn')
        .map(({ to }) => to.name)
        .toSorted(),
    ).toEqual(['Otto Vane', 'Runa Sedge'])
    const next = await own.issue()
    expect(next).toMatchObject({ label: 'A', state: 'in review' })
  })
})
