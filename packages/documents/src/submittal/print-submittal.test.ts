import { water } from '@coldfill/engine'
import { strFromU8, unzipSync } from 'fflate'
import { expect, it } from 'vitest'
import { clinicProject, documentOptions } from '../testing/index.ts'
import { printSubmittal } from './print-submittal.ts'

const project = clinicProject(water.functions)
const options = documentOptions('US')

/** The printed side of LibreOffice: a PDF that says on which page each bookmark of the file stands. */
const printing =
  (pageOf: (printing: number, heading: number) => number | null) =>
  (count = 0) =>
  (docx: Uint8Array): Promise<Uint8Array> => {
    count += 1
    const xml = strFromU8(unzipSync(docx)['word/document.xml'] ?? new Uint8Array())
    const anchors = [...new Set(xml.match(/_Toc\d+/g))]
    const kids = Array.from({ length: 60 }, (_, index) => `${index + 100} 0 R`).join(' ')
    const places = anchors.flatMap((anchor, index) => {
      const page = pageOf(count, index)
      return page === null ? [] : [`/#5F${anchor.slice(1)}[${page + 99} 0 R/XYZ 1 2 0]`]
    })
    const text = `<</Type/Pages/Kids[ ${kids} ]>><<${places.join('')}>>/CreationDate(D:20310102030405Z')`
    return Promise.resolve(new TextEncoder().encode(text))
  }

/** Entries of the contents list: title and page. */
const contents = (docx: Uint8Array): string[][] =>
  (strFromU8(unzipSync(docx)['word/document.xml'] ?? new Uint8Array()).match(/<w:p>.*?<\/w:p>/gs) ?? [])
    .filter((paragraph) => paragraph.includes('w:val="TOC1"'))
    .map((paragraph) => [...paragraph.matchAll(/<w:t [^>]*>([^<]*)</g)].map(([, words = '']) => words))

it('puts in the pages of the print, and dates it by the issue', async () => {
  const stages: string[] = []
  const { docx, pdf, noPages, noPdf } = await printSubmittal(project, options, printing(() => 7)(), (stage) =>
    stages.push(stage),
  )
  expect([noPages, noPdf]).toEqual([null, null])
  expect(stages).toEqual(['pages', 'pdf'])
  expect(contents(docx).length).toBeGreaterThan(3)
  for (const entry of contents(docx)) expect(entry.at(-1)).toBe('7')
  const time = options.titleBlock.date.slice(0, 10).replaceAll('-', '')
  expect(strFromU8(pdf ?? new Uint8Array())).toContain(`/CreationDate(D:${time}000000Z')`)
})

it('puts them in anew where writing the numbers moved the headings', async () => {
  const { docx, noPages } = await printSubmittal(project, options, printing((count) => (count === 1 ? 7 : 8))())
  expect(noPages).toBeNull()
  for (const entry of contents(docx)) expect(entry.at(-1)).toBe('8')
})

it('leaves them out, with the reason, where they do not come to rest or a heading is not found', async () => {
  const restless = await printSubmittal(project, options, printing((count) => count)())
  expect(restless.noPages).toMatch(/moved each time/)
  expect(restless.pdf).not.toBeNull()
  const blind = await printSubmittal(project, options, printing((_, heading) => (heading === 2 ? null : 7))())
  expect(blind.noPages).toMatch(/was not found/)
  for (const { docx } of [restless, blind]) for (const entry of contents(docx)) expect(entry).toHaveLength(1)
})

it('gives the document where nothing can be printed', async () => {
  const { docx, pdf, noPages, noPdf } = await printSubmittal(project, options, () =>
    Promise.reject(new Error('No printer.')),
  )
  expect({ pdf, noPages, noPdf }).toEqual({ pdf: null, noPages: 'No printer.', noPdf: 'No printer.' })
  expect(contents(docx).length).toBeGreaterThan(3)
})

it('keeps the numbers that were found where the last print fails', async () => {
  let count = 0
  const print = printing(() => 7)()
  const { docx, pdf, noPages, noPdf } = await printSubmittal(project, options, (laidOut) => {
    count += 1
    return count === 1 ? print(laidOut) : Promise.reject(new Error('Out of paper.'))
  })
  expect({ pdf, noPages, noPdf }).toEqual({ pdf: null, noPages: null, noPdf: 'Out of paper.' })
  for (const entry of contents(docx)) expect(entry.at(-1)).toBe('7')
})
