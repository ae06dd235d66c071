import { readFile } from 'node:fs/promises'
import { zipSync } from 'fflate'
import { eq } from 'drizzle-orm'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { OfficeCatalogue, Problem, Results, Revision } from '@coldfill/contract'
import { catalogues } from '../../db/schema/index.ts'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

const address = '/api/office/catalogue'
const example = new URL('../../../../../examples/catalogue/vessels.csv', import.meta.url)
const head =
  'maker,model,kind,volume (gal),acceptance volume (gal),maximum pressure (psi),maximum temperature (°F),potable,stamp'
const bladder = (model: string, gallons: number): string =>
  `Wendholt,${model},expansion tank,${gallons},,125,240,no,yes`

let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t, 'T-1', loopSpec().replace('method: ashrae', 'method: ashrae\n        selection: auto'))
})
afterAll(() => t.close())

const put = (content: string | Uint8Array, fileName = 'vessels.csv') =>
  team.administrator.put(address).send({ fileName, content: Buffer.from(content).toString('base64') })
const catalogue = async (): Promise<OfficeCatalogue> =>
  (await team.administrator.get(address).expect(200)).body as OfficeCatalogue
/** Freezes the working copy. Its files are of no interest here and are not waited for. */
const issue = async (of: Team): Promise<Revision> =>
  (await of.consultant.post(`${of.at}/revisions`).send({ purpose: 'review' }).expect(201)).body as Revision
/** Hash of the working copy, which the next issue would have. */
const workingHash = async (of: Team): Promise<string> =>
  ((await of.consultant.get(`${of.at}/results`).expect(200)).body as Results).contentHash
const chosen = async (query = ''): Promise<string | null> => {
  const { result } = (await team.consultant.get(`${team.at}/results${query}`).expect(200)).body as Results
  return result.vessels[0]?.selected?.model ?? null
}

describe('the catalogue of an office', () => {
  it('is empty at first, and says which columns a file needs', async () => {
    const empty = await catalogue()
    expect(empty).toMatchObject({ catalogue: null, earlier: [] })
    expect(empty.columns.filter(({ required }) => required).map(({ heading }) => heading)).toContain('maximum pressure')
    expect(await chosen()).toBeNull()
    await team.administrator.delete(address).expect(404)
  })

  it('stores nothing of a file without a readable row, and says what is wrong by line and column', async () => {
    const bad = await put(`${head}\nWendholt,W-1,expansion tank,wide,,125,240,no,yes\n`).expect(422)
    const problem = bad.body as Problem
    expect(problem.code).toBe('catalogue_unreadable')
    expect(problem.errors).toEqual([expect.objectContaining({ line: 2, column: 'volume' })])
    const missing = await put('maker,model\nWendholt,W-1\n').expect(422)
    expect((missing.body as Problem).errors).toContainEqual(
      expect.objectContaining({ line: 1, column: 'maximum pressure' }),
    )
    await put(Uint8Array.of(0x50, 0x4b, 3, 4, 1, 2, 3), 'broken.xlsx').expect(422)
    await put(`${head}\n`).expect(422)
    await put(Uint8Array.of(0xff, 0xfe, 0x00)).expect(422)
    expect(await catalogue()).toMatchObject({ catalogue: null, earlier: [] })
  })

  it('refuses a file that is too large, one that unpacks to too much, and a body of another form', async () => {
    await put(new Uint8Array(2_000_001)).expect(413)
    await put(new Uint8Array(4_000_000)).expect(413)
    const bomb = zipSync({ 'xl/worksheets/sheet1.xml': new Uint8Array(200_000_000) })
    expect(bomb.length).toBeLessThan(2_000_000)
    const res = await put(bomb, 'bomb.xlsx').expect(422)
    expect((res.body as Problem).errors?.[0]?.message).toContain('unpacks')
    await team.administrator.put(address).send({ fileName: 'a.csv', content: '%%%' }).expect(400)
    await team.administrator.put(address).send({ fileName: '', content: '' }).expect(400)
  })

  it('is there for the administrator alone, each with the catalogue of their own office', async () => {
    for (const method of ['get', 'put', 'delete'] as const) {
      await t.anonymous()[method](address).expect(401)
      for (const agent of [team.consultant, team.reviewer, team.contractor]) await agent[method](address).expect(404)
    }
    await put(`${head}\n${bladder('W-400', 400)}\n`).expect(200)
    expect((await team.stranger.get(address).expect(200)).body).toMatchObject({ catalogue: null, earlier: [] })
    await team.stranger.delete(address).expect(404)
  })

  it('gives the rows back with what was left out', async () => {
    const res = await put(`${head}\n${bladder('W-90', 90)}\n${bladder('W-x', -1)}\n`, 'two.csv').expect(200)
    const { catalogue: current, earlier } = res.body as OfficeCatalogue
    expect(current).toMatchObject({ fileName: 'two.csv', uploadedBy: 'Ada Brook' })
    // 1 US gal is 231 in³ of 25.4 mm exactly.
    expect(current?.rows).toEqual([expect.objectContaining({ model: 'W-90', line: 2, stamped: true })])
    expect(current?.rows[0]?.volume).toBeCloseTo(90 * 231 * 0.0254 ** 3, 12)
    expect(current?.problems).toEqual([expect.objectContaining({ line: 3, column: 'volume' })])
    expect(earlier).toEqual([expect.objectContaining({ fileName: 'vessels.csv', rowCount: 1 })])
  })

  it('takes the example, which can be downloaded', async () => {
    const res = await team.administrator.get(`${address}/example`).expect(200)
    expect(res.headers['content-disposition']).toContain('vessels.csv')
    expect(res.text).toBe(await readFile(example, 'utf8'))
    const stored = (await put(res.text).expect(200)).body as OfficeCatalogue
    expect(stored.catalogue?.problems).toEqual([])
    expect(stored.catalogue?.rows).toHaveLength(res.text.trimEnd().split('\n').length - 1)
  })

  it('tells uploads and what they replaced in the audit trail', async () => {
    await team.administrator.delete(address).expect(204)
    const { events } = (await team.administrator.get('/api/office/audit').expect(200)).body as {
      events: { action: string; detail: string; who: string }[]
    }
    expect(events[0]).toMatchObject({ action: 'catalogue taken away', detail: 'vessels.csv', who: 'Ada Brook' })
    expect(events[1]?.detail).toContain('in place of two.csv')
    expect((await catalogue()).catalogue).toBeNull()
  })
})

describe('vessels chosen from it', () => {
  it('stand in the sizing as typed and as saved, and leave a frozen revision as it was', async () => {
    await put(`${head}\n${bladder('W-400', 400)}\n`).expect(200)
    const text = loopSpec().replace('method: ashrae', 'method: ashrae\n        selection: auto')
    const typed = await team.consultant.post(`${team.at}/sizing`).send({ text }).expect(200)
    expect((typed.body as Results['result']).vessels[0]?.selected?.model).toBe('W-400')
    expect(await chosen()).toBe('W-400')
    const before = await workingHash(team)
    expect((await issue(team)).contentHash).toBe(before)
    const frozen = (await team.reviewer.get(`${team.at}/results?rev=-`).expect(200)).body as Results

    await put(`${head}\n${bladder('W-500', 500)}\n`).expect(200)
    expect(await chosen()).toBe('W-500')
    const later = (await team.reviewer.get(`${team.at}/results?rev=-`).expect(200)).body as Results
    expect(later).toEqual(frozen)
    expect(await chosen('?rev=-')).toBe('W-400')

    await team.administrator.delete(address).expect(204)
    expect(await chosen()).toBeNull()
    expect(await chosen('?rev=-')).toBe('W-400')
    expect(await workingHash(team)).not.toBe(before)
  })

  it('show nothing of a revision whose catalogue was altered in the store', async () => {
    const own = await createTeam(t, 'T-30')
    await own.administrator
      .put(address)
      .send({ fileName: 'a.csv', content: Buffer.from(`${head}\n${bladder('W-400', 400)}\n`).toString('base64') })
      .expect(200)
    await issue(own)
    const { catalogue: current } = (await own.administrator.get(address)).body as OfficeCatalogue
    await t.deps.db
      .update(catalogues)
      .set({ rowsJson: '[]' })
      .where(eq(catalogues.hash, current?.hash ?? ''))
    await own.reviewer.get(`${own.at}/results`).expect(500)
    expect(t.errors.splice(0).join()).toContain('is not the content that was frozen')
  })

  it('change the hash of the content even where no result changes', async () => {
    const own = await createTeam(t, 'T-31')
    const before = await workingHash(own)
    await own.administrator
      .put(address)
      .send({ fileName: 'b.csv', content: Buffer.from(`${head}\n${bladder('W-7', 7)}\n`).toString('base64') })
      .expect(200)
    expect(await workingHash(own)).not.toBe(before)
  })
})
