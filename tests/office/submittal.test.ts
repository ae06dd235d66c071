import { readFileSync } from 'node:fs'
import { writeSchedule, writeSubmittal } from '@coldfill/documents'
import { documentOptions } from '@coldfill/documents/testing'
import { sizeSpec } from '@coldfill/sizing'
import { strFromU8, unzipSync } from 'fflate'
import { describe, expect, it } from 'vitest'
import { convert, hasOffice, leftOut } from './office.ts'

const result = (building: string) =>
  sizeSpec(readFileSync(new URL(`../../examples/${building}/spec.yaml`, import.meta.url), 'utf8'))

/** Pages of a PDF by its page tree, which LibreOffice does not compress. */
const pagesOf = (pdf: Uint8Array): number =>
  Buffer.from(pdf)
    .toString('latin1')
    .match(/\/Type\s*\/Page\b(?!s)/g)?.length ?? 0

describe.skipIf(!hasOffice).each(['fernhollow', 'alder-court'])(
  `the documents of %s in LibreOffice${leftOut}`,
  (building) => {
    const project = result(building)
    const options = documentOptions(project.project.units)

    it('opens the submittal and reads every equation of it as one', async () => {
      const bytes = await writeSubmittal(project, options)
      const document = strFromU8(unzipSync(bytes)['word/document.xml'] ?? new Uint8Array())
      const parts = Object.entries(unzipSync(convert('submittal.docx', bytes, 'odt'))).map(
        ([name, part]) => [name, strFromU8(part)] as const,
      )
      const equations = parts.filter(([name, xml]) => /^Object \d+\/content\.xml$/.test(name) && xml.includes('<math'))
      expect(equations.length).toBeGreaterThan(50)
      expect(equations).toHaveLength(document.match(/<m:oMath>/g)?.length ?? -1)
      // A part that its equation language does not understand becomes an error element, drawn as an inverted question mark.
      expect(equations.filter(([, xml]) => /merror|¿/.test(xml)).map(([name]) => name)).toEqual([])
      const text = parts.find(([name]) => name === 'content.xml')?.[1] ?? ''
      for (const vessel of project.vessels) expect(text).toContain(vessel.mark)
    })

    it('prints both files', async () => {
      const submittal = convert('submittal.docx', await writeSubmittal(project, options), 'pdf')
      const schedule = convert('schedule.xlsx', await writeSchedule(project, options), 'pdf')
      expect(pagesOf(submittal)).toBeGreaterThan(7)
      // Cover, a schedule a kind, a calculation a vessel, assumptions, findings, sources and fluid data: a page each at least.
      expect(pagesOf(schedule)).toBeGreaterThan(2 + project.vessels.length + 4)
    })
  },
)
