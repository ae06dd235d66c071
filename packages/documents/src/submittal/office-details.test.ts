import { water } from '@coldfill/engine'
import ExcelJS from 'exceljs'
import { strFromU8, unzipSync } from 'fflate'
import { describe, expect, it } from 'vitest'
import type { DocumentOptions } from '../document-options.ts'
import { clinicProject, documentOptions } from '../testing/index.ts'
import { writeSchedule } from '../xlsx/write-schedule.ts'
import { writeSubmittal } from './write-submittal.ts'

const project = clinicProject(water.functions)
const usual = documentOptions('US')
/** One grey pixel, written out by hand after the PNG specification. */
const pixel = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAAAAAA6fptVAAAACklEQVR4nGNgAAAAAgABSK+kcQAAAABJRU5ErkJggg==',
  'base64',
)
const options: DocumentOptions = {
  ...usual,
  titleBlock: {
    ...usual.titleBlock,
    office: 'Sill "&" Marrow',
    lines: ['14 Weir Lane, Oxbow', 'office@sillmarrow.example'],
    captions: { prepared: 'Designed by', checked: 'Checked by', approved: 'Engineer of record' },
  },
  logo: { data: new Uint8Array(pixel), type: 'png', width: 1, height: 1 },
}

const rows = (docx: Uint8Array): string[] =>
  (strFromU8(unzipSync(docx)['word/document.xml'] ?? new Uint8Array()).match(/<w:tr[ >].*?<\/w:tr>/gs) ?? []).map(
    (row) => row.replace(/<\/w:tc>/g, '|').replace(/<[^>]+>/g, ''),
  )

describe('what an office prints on its documents', () => {
  it('stands on the cover of the submittal: address and captions, also where nobody has signed', async () => {
    const { approvedBy: _, ...titleBlock } = options.titleBlock
    const written = rows(await writeSubmittal(project, { ...options, titleBlock }))
    expect(written).toContain('Address|14 Weir Lane, Oxbow · office@sillmarrow.example|')
    expect(written.some((row) => row.startsWith('Designed by|'))).toBe(true)
    expect(written).toContain('Engineer of record||')
    expect(written.some((row) => row.startsWith('Prepared|'))).toBe(false)
    expect(rows(await writeSubmittal(project, usual)).some((row) => row.startsWith('Prepared|'))).toBe(true)
  })

  it('stands on the cover of the workbook, the logo with words for those who cannot see it', async () => {
    const bytes = await writeSchedule(project, options)
    const workbook = new ExcelJS.Workbook()
    await workbook.xlsx.load(bytes as never)
    const cover = workbook.worksheets[0]
    const texts: string[] = []
    cover?.eachRow((row) => texts.push(`${row.getCell(1).text}|${row.getCell(2).text}`))
    expect(texts).toContain('Address|14 Weir Lane, Oxbow · office@sillmarrow.example')
    expect(texts.some((text) => text.startsWith('Engineer of record|'))).toBe(true)
    expect(cover?.getImages()).toHaveLength(1)
    const parts = unzipSync(bytes)
    expect(strFromU8(parts['xl/drawings/drawing1.xml'] ?? new Uint8Array())).toContain(
      'descr="Logo of Sill &#34;&#38;&#34; Marrow"',
    )
    expect(Buffer.from(parts['xl/media/image1.png'] ?? new Uint8Array()).equals(pixel)).toBe(true)
    expect(Buffer.from(await writeSchedule(project, options)).equals(bytes)).toBe(true)
  })
})
