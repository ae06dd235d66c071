import { water } from '@coldfill/engine'
import { strFromU8, unzipSync } from 'fflate'
import { beforeAll, describe, expect, it } from 'vitest'
import { clinicProject, documentOptions, reviewedOptions } from '../testing/index.ts'
import { writeReviewCopy, writeSubmittal } from './write-submittal.ts'

const project = clinicProject(water.functions)
const options = reviewedOptions('US', 'Issued for review')
const redlines = options.redlines ?? []

const partsOf = (bytes: Uint8Array): Map<string, string> =>
  new Map(Object.entries(unzipSync(bytes)).map(([name, part]) => [name, strFromU8(part)]))
const textOf = (xml: string): string => [...xml.matchAll(/<w:t[^>]*>([^<]*)<\/w:t>/g)].map(([, text]) => text).join('')

describe('the review copy', () => {
  let bytes: Uint8Array
  let parts: Map<string, string>
  let document: string
  beforeAll(async () => {
    bytes = await writeReviewCopy(project, options)
    parts = partsOf(bytes)
    document = parts.get('word/document.xml') ?? ''
  })

  it('has every message as a comment of its author, with initials and time', () => {
    const comments = parts.get('word/comments.xml')?.match(/<w:comment .*?<\/w:comment>/gs) ?? []
    const messages = redlines.flatMap((redline) => redline.messages)
    expect(comments).toHaveLength(messages.length)
    messages.forEach(({ author, at }, index) => {
      expect(comments[index]).toContain(`w:author="${author.name}"`)
      expect(comments[index]).toContain(`w:initials="${author.initials}"`)
      expect(comments[index]).toContain(`w:date="${at.slice(0, 16)}`)
    })
    expect(comments[0]).toContain('On 12 psig, proposes 22.2 psig, must be answered.')
    expect(comments[2]).toContain('&lt;drain&gt; &amp;')
  })

  it('puts each thread on the place that its redline is about', () => {
    /** Words of the cell in which a comment begins, and of the row. */
    const place = (id: number) => {
      const cells = document.match(/<w:tc>.*?<\/w:tc>/gs) ?? []
      const rows = document.match(/<w:tr>.*?<\/w:tr>/gs) ?? []
      const start = `<w:commentRangeStart w:id="${id}"/>`
      return {
        cell: textOf(cells.find((cell) => cell.includes(start)) ?? ''),
        row: textOf(rows.find((row) => row.includes(start)) ?? ''),
      }
    }
    const precharge = project.vessels.find((vessel) => vessel.mark === 'ET-1')?.results['precharge']?.value ?? 0
    // The redline on the precharge of ET-1, and its answer, are on that number: pascals over 6894.757 make psi.
    for (const id of [1, 2]) expect(Number(place(id).cell)).toBeCloseTo(precharge / 6894.757, 0)
    expect(place(3).cell).toBe('TET-1')
    expect(place(4)).toEqual({ cell: 'A1', row: expect.stringMatching(/^A1/) })
    // A redline on the spec has no row of its own but that of the list.
    expect(place(5)).toEqual({ cell: '4', row: expect.stringContaining('HWS / temperatures / high') })
  })

  it('begins, ends and refers to each comment once', () => {
    const ids = redlines.flatMap((redline) => redline.messages).map((_, index) => String(index + 1))
    for (const element of ['commentRangeStart', 'commentRangeEnd', 'commentReference']) {
      const found = [...document.matchAll(new RegExp(`<w:${element} w:id="(\\d+)"/>`, 'g'))].map(([, id]) => id)
      expect(new Set(found)).toEqual(new Set(ids))
      expect(found).toHaveLength(ids.length)
    }
  })

  it('hangs answers under their redline and resolves what is closed', () => {
    const extended = parts.get('word/commentsExtended.xml') ?? ''
    expect(extended.match(/w15:paraIdParent=/g)).toHaveLength(1)
    expect(extended.match(/w15:done="1"/g)?.length).toBeGreaterThanOrEqual(1)
  })

  it('gives the same bytes each time, and is the submittal where nobody wrote anything', async () => {
    expect(Buffer.from(await writeReviewCopy(project, options)).equals(Buffer.from(bytes))).toBe(true)
    const plain = { ...documentOptions('US'), redlines: [] }
    expect(
      Buffer.from(await writeReviewCopy(project, plain)).equals(Buffer.from(await writeSubmittal(project, plain))),
    ).toBe(true)
  })
})
