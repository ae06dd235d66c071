import { deflateSync, crc32 } from 'node:zlib'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { OfficeTitleBlock, type Problem } from '@coldfill/contract'
import { download, partOf, wordsOf } from '../../testing/documents.ts'
import { binaryBody } from '../../testing/binary-body.ts'
import { loopSpec } from '../../testing/specs.ts'
import { createTeam, type Team } from '../../testing/team.ts'
import { createTestApp, type TestApp } from '../../testing/test-app.ts'

const address = '/api/office/title-block'
let t: TestApp
let team: Team

beforeAll(async () => {
  t = await createTestApp()
  team = await createTeam(t)
})
afterAll(() => t.close())

/** A grey PNG, chunk by chunk after the specification. */
const png = (width: number, height: number): Buffer => {
  const chunk = (type: string, data: Buffer): Buffer => {
    const body = Buffer.concat([Buffer.from(type, 'latin1'), data])
    const [length, check] = [Buffer.alloc(4), Buffer.alloc(4)]
    length.writeUInt32BE(data.length)
    check.writeUInt32BE(crc32(body))
    return Buffer.concat([length, body, check])
  }
  const head = Buffer.alloc(13)
  head.writeUInt32BE(width, 0)
  head.writeUInt32BE(height, 4)
  head[8] = 8
  // Each row begins with its filter: none.
  const row = Buffer.alloc(width + 1, 0x80)
  row[0] = 0
  const rows = Buffer.concat(Array.from({ length: height }, () => row))
  return Buffer.concat([
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(rows)),
    chunk('IEND', Buffer.alloc(0)),
  ])
}
/** Head and end of a JPEG of that size; what is between does not matter to who reads its size. */
const jpeg = (width: number, height: number): Buffer =>
  Buffer.from([
    ...[0xff, 0xd8, 0xff, 0xe0, 0, 16, 0x4a, 0x46, 0x49, 0x46, 0, 1, 1, 0, 0, 1, 0, 1, 0, 0],
    ...[0xff, 0xc0, 0, 11, 8, height >> 8, height & 255, width >> 8, width & 255, 1, 1, 0x11, 0],
    ...[0xff, 0xd9],
  ])

const read = async (): Promise<OfficeTitleBlock> =>
  OfficeTitleBlock.parse((await team.administrator.get(address).expect(200)).body)
const putLogo = (bytes: Uint8Array, fileName = 'logo.png') =>
  team.administrator.put(`${address}/logo`).send({ fileName, content: Buffer.from(bytes).toString('base64') })
const texts = {
  name: 'Sill & Marrow Engineers',
  lines: ['14 Weir Lane, Oxbow', 'office@sillmarrow.example'],
  captions: { prepared: 'Designed by', checked: 'Checked by', approved: 'Engineer of record' },
  paper: 'A4',
}

describe('the title block of an office', () => {
  it('has the name of the office and the usual captions until it is changed', async () => {
    expect(await read()).toEqual({
      name: 'Office of T-1',
      lines: [],
      captions: { prepared: 'Prepared', checked: 'Checked', approved: 'Approved' },
      paper: 'by units',
      logo: null,
      changed: null,
    })
  })

  it('keeps what the administrator wrote', async () => {
    const res = await team.administrator
      .put(address)
      .send({ ...texts, lines: [...texts.lines, '  '] })
      .expect(200)
    expect(OfficeTitleBlock.parse(res.body)).toMatchObject({ ...texts, changed: { by: 'Ada Brook' } })
    expect(await read()).toEqual(res.body)
  })

  it('lists everything that is wrong', async () => {
    const res = await team.administrator
      .put(address)
      .send({
        name: ' ',
        lines: ['a\nb', 'c', 'd', 'e'],
        captions: { prepared: '', checked: 'C', approved: 'A' },
        paper: 'A0',
      })
      .expect(400)
    const pointers = (res.body as { errors: { pointer: string }[] }).errors.map(({ pointer }) => pointer)
    expect(pointers.toSorted()).toEqual(['/captions/prepared', '/lines/0', '/name', '/paper'])
    await team.administrator
      .put(address)
      .send({ ...texts, lines: ['a', 'b', 'c', 'd', 'e'] })
      .expect(400)
    expect((await read()).name).toBe(texts.name)
  })

  it('is there for the administrator alone, each with that of their own office', async () => {
    for (const agent of [team.consultant, team.reviewer, team.contractor]) {
      await agent.get(address).expect(404)
      await agent.put(address).send(texts).expect(404)
      await agent.put(`${address}/logo`).send({}).expect(404)
      await agent.get(`${address}/logo`).expect(404)
      await agent.delete(`${address}/logo`).expect(404)
    }
    await t.anonymous().get(`${address}/logo`).expect(401)
    expect((await team.stranger.get(address).expect(200)).body).toMatchObject({ changed: null })
  })
})

describe('the logo', () => {
  it('is taken as PNG or JPEG with the pixels that the file has, and shown again', async () => {
    await team.administrator.get(`${address}/logo`).expect(404)
    await team.administrator.delete(`${address}/logo`).expect(404)
    await putLogo(jpeg(640, 200), 'misnamed.png').expect(200)
    expect((await read()).logo).toMatchObject({ type: 'jpg', width: 640, height: 200 })
    const bytes = png(300, 100)
    await putLogo(bytes).expect(200)
    const { logo, name } = await read()
    expect(logo).toMatchObject({ fileName: 'logo.png', type: 'png', width: 300, height: 100, size: bytes.length })
    expect(name).toBe(texts.name)
    const shown = await team.administrator
      .get(logo?.href ?? '')
      .buffer(true)
      .parse(binaryBody)
      .expect(200)
    expect(shown.headers['content-type']).toBe('image/png')
    expect(bytes.equals(shown.body as Buffer)).toBe(true)
    await team.stranger.get(`${address}/logo`).expect(404)
  })

  it.each([
    ['a drawing', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'), /neither a PNG nor a JPEG/],
    ['a name only', Buffer.from('logo.png'), /neither a PNG nor a JPEG/],
    ['nothing', Buffer.alloc(0), /neither a PNG nor a JPEG/],
    ['a picture cut short', png(300, 100).subarray(0, 60), /ends in the middle/],
    ['a dot', png(4, 4), /has 4 × 4 pixels/],
    ['a giant', jpeg(9_000, 300), /has 9000 × 300 pixels/],
    ['a thread', png(1_000, 20), /too narrow/],
  ])('is refused where it is %s', async (_, bytes, why) => {
    const before = await read()
    const res = await putLogo(bytes).expect(422)
    expect(res.body as Problem).toMatchObject({ code: 'logo_unreadable', detail: expect.stringMatching(why) as string })
    expect(await read()).toEqual(before)
  })

  it('is refused above its limit', async () => {
    await putLogo(Buffer.concat([png(300, 100), Buffer.alloc(1_000_000)])).expect(413)
    await putLogo(Buffer.alloc(4_000_000)).expect(413)
    await team.administrator.put(`${address}/logo`).send({ fileName: 'a.png', content: '%%' }).expect(400)
  })
})

describe('documents', () => {
  it('carry it as it was when they were asked for, and a later one in later issues', async () => {
    const first = await team.issue()
    const bytesOf = async (revision: typeof first, kind: string): Promise<Buffer> =>
      download(team.consultant, revision.files.find((file) => file.kind === kind)?.href ?? '')
    const submittal = await bytesOf(first, 'submittal')
    const words = wordsOf(submittal)
    for (const text of ['Sill & Marrow Engineers', '14 Weir Lane, Oxbow', 'Designed by', 'Engineer of record'])
      expect(words).toContain(text)
    // A4 is 210 mm wide: 11906 twentieths of a point.
    expect(partOf(submittal, 'word/document.xml')).toContain('w:w="11906"')
    const logo = png(300, 100)
    const { unzipSync } = await import('fflate')
    for (const kind of ['submittal', 'schedule']) {
      const pictures = Object.values(unzipSync(await bytesOf(first, kind))).map((part) => Buffer.from(part))
      expect(pictures.some((part) => part.equals(logo))).toBe(true)
    }

    await team.administrator.delete(`${address}/logo`).expect(204)
    await team.administrator
      .put(address)
      .send({ ...texts, name: 'Sill Marrow', paper: 'by units' })
      .expect(200)
    await team.save(loopSpec({ number: 'T-1' }).replace('20 ft', '22 ft'))
    const next = await bytesOf(await team.issue(), 'submittal')
    expect(wordsOf(next)).toContain('Sill Marrow')
    expect(Object.values(unzipSync(next)).some((part) => Buffer.from(part).equals(logo))).toBe(false)
    expect((await bytesOf(first, 'submittal')).equals(submittal)).toBe(true)
  })

  it('are told of in the audit trail', async () => {
    const { events } = (await team.administrator.get('/api/office/audit').expect(200)).body as {
      events: { action: string; detail: string; who: string }[]
    }
    const told = events.filter(({ action }) => /title block|logo/.test(action))
    expect(told.map(({ action }) => action)).toEqual([
      'title block changed',
      'logo removed',
      'logo uploaded',
      'logo uploaded',
      'title block changed',
    ])
    expect(told[2]).toMatchObject({ who: 'Ada Brook', detail: expect.stringContaining('300 × 100 pixels') as string })
  })
})
