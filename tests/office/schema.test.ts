import { readFileSync } from 'node:fs'
import validate from '@ooxml-tools/validate'
import { writeReviewCopy, writeSchedule, writeSubmittal } from '@coldfill/documents'
import { everyVessel, reviewedOptions } from '@coldfill/documents/testing'
import { sizeSpec } from '@coldfill/sizing'
import { strFromU8, strToU8, unzipSync, zipSync } from 'fflate'
import { describe, expect, it } from 'vitest'
import { brokenReferences } from './references.ts'

const spec = (building: string): string =>
  readFileSync(new URL(`../../examples/${building}/spec.yaml`, import.meta.url), 'utf8')

const SPECS = { fernhollow: spec('fernhollow'), 'alder-court': spec('alder-court'), 'every vessel': everyVessel }

type Format = 'docx' | 'xlsx'

/** What the validator has against a file, with where. */
const against = async (bytes: Uint8Array, format: Format): Promise<string[]> => {
  const found = await validate(bytes, format, 'Microsoft365')
  return found.map(({ description, path }) => `${path.partUri} ${path.xpath}: ${description}`)
}

/** A file with one part changed; the change must be one. */
const changed = (bytes: Uint8Array, part: string, from: string | RegExp, to: string): Uint8Array => {
  const parts = unzipSync(bytes)
  const before = strFromU8(parts[part] ?? new Uint8Array())
  const after = before.replace(from, to)
  expect(after).not.toBe(before)
  return zipSync({ ...parts, [part]: strToU8(after) })
}

describe('both documents against the schemas of ISO/IEC 29500', () => {
  describe.each(Object.keys(SPECS) as (keyof typeof SPECS)[])('%s', (name) => {
    const result = sizeSpec(SPECS[name])
    const options = reviewedOptions(result.project.units, 'Issued for review')

    it('writes a valid submittal in which everything leads somewhere', async () => {
      const bytes = await writeSubmittal(result, options)
      expect(brokenReferences(bytes)).toEqual([])
      expect(await against(bytes, 'docx')).toEqual([])
    })

    it('writes a valid workbook in which everything leads somewhere', async () => {
      const bytes = await writeSchedule(result, options)
      expect(brokenReferences(bytes)).toEqual([])
      expect(await against(bytes, 'xlsx')).toEqual([])
    })
  })

  it('writes a valid review copy', async () => {
    const bytes = await writeReviewCopy(sizeSpec(SPECS.fernhollow), reviewedOptions('US', 'Issued for review'))
    expect(brokenReferences(bytes)).toEqual([])
    expect(await against(bytes, 'docx')).toEqual([])
  })
})

describe('a broken file is caught', () => {
  const result = sizeSpec(SPECS.fernhollow)
  const options = reviewedOptions('US', 'Issued for review')

  it.each([
    ['a child out of order', /(<w:pStyle [^>]*\/>)(<w:jc [^>]*\/>|<w:keepNext\/>|<w:pageBreakBefore\/>)/, '$2$1'],
    ['an element that is none', '<w:sectPr>', '<w:sectPr><w:nothing/>'],
    ['a value that is none', 'w:orient="landscape"', 'w:orient="askew"'],
  ])('by the schema: %s in the submittal', async (_, from, to) => {
    const bytes = changed(await writeSubmittal(result, options), 'word/document.xml', from, to)
    expect((await against(bytes, 'docx')).length).toBeGreaterThan(0)
  })

  it.each([
    ['xl/styles.xml', /(<sz [^>]*\/>)(<color [^>]*\/>)/, '$2$1'],
    ['xl/worksheets/sheet1.xml', /(<sheetData.*<\/sheetData>)(.*?<pageMargins [^>]*\/>)/s, '$2$1'],
  ])('by the schema: an order in %s', async (part, from, to) => {
    const bytes = changed(await writeSchedule(result, options), part, from, to)
    expect((await against(bytes, 'xlsx')).length).toBeGreaterThan(0)
  })

  it.each([
    ['word/document.xml', '<w:pStyle w:val="Heading1"/>', '<w:pStyle w:val="Heading7"/>', 'the style Heading7'],
    ['word/document.xml', /w:anchor="[^"]+"/, 'w:anchor="_Toc1"', 'the bookmark _Toc1'],
    ['word/document.xml', /(<a:blip r:embed=")[^"]+"/, '$1rIdNone"', 'the relationship rIdNone'],
    ['word/_rels/document.xml.rels', 'Target="styles.xml"', 'Target="looks.xml"', 'leads to word/looks.xml'],
    ['[Content_Types].xml', /<Default[^>]*Extension="png"[^>]*\/>/, '', '.png has no content type'],
    ['word/document.xml', /(<wp:docPr id=")[^"]+("[^]*?<wp:docPr id=")[^"]+"/, '$17$27"', 'two drawings have the id 7'],
  ])('by what leads nowhere: %s, %s', async (part, from, to, said) => {
    const bytes = changed(await writeSubmittal(result, options), part, from, to)
    expect(brokenReferences(bytes).join('\n')).toContain(said)
  })

  it.each([
    ['xl/workbook.xml', /(<definedName name="ET_1_\w+">)&apos;ET-1&apos;/, '$1&apos;ET-0&apos;', 'the sheet ET-0'],
    ['xl/worksheets/sheet1.xml', / s="\d+"/, ' s="9999"', 'the look 9999'],
    ['xl/worksheets/sheet1.xml', /t="s"([^>]*)><v>\d+/, 't="s"$1><v>99999', 'the text 99999'],
    ['xl/tables/table1.xml', /(<tableColumn [^>]*name=")[^"]*/, '$1Another', 'the column Another'],
    ['xl/tables/table1.xml', /(name=")(?:Serves)(")/, '$1Mark$2', 'has two columns mark'],
    ['xl/tables/table1.xml', /(<table [^>]*ref="A\d+:)[A-Z]+/, '$1ZZ', 'columns on A to ZZ'],
  ])('by what leads nowhere: %s, %s', async (part, from, to, said) => {
    const bytes = changed(await writeSchedule(result, options), part, from, to)
    expect(brokenReferences(bytes).join('\n')).toContain(said)
  })
})
