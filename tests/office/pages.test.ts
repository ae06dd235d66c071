import { readFileSync } from 'node:fs'
import { officePages, openOffice, printSubmittal, writeReviewCopy, writeSubmittal } from '@coldfill/documents'
import { documentOptions, reviewedOptions } from '@coldfill/documents/testing'
import { sizeSpec } from '@coldfill/sizing'
import { strFromU8, unzipSync } from 'fflate'
import { expect, it } from 'vitest'
import { convert, hasOffice, leftOut } from './office.ts'

/** The outline leaves out the second of two spaces. */
const oneSpaced = (text: string): string => text.replace(/\s+/g, ' ')

/** Page of each heading by the outline of the PDF, in order; the numbers in the contents list come by another way. */
const outline = (pdf: Uint8Array): [title: string, page: number][] => {
  const text = Buffer.from(pdf).toString('latin1')
  const kids = /\/Type\s*\/Pages\b[^>]*?\/Kids\s*\[([^\]]*)\]/s.exec(text)?.[1] ?? ''
  const pages = [...kids.matchAll(/(\d+)\s+0\s+R/g)].map(([, object]) => object)
  return [...text.matchAll(/\/Title<FEFF([0-9A-F]+)>\s*\/Dest\[(\d+) 0 R/g)].map(([, title = '', object]) => [
    oneSpaced(Buffer.from(title, 'hex').swap16().toString('utf16le')),
    pages.indexOf(object) + 1,
  ])
}

it.skipIf(!hasOffice)(`the contents list has the pages that the file is printed on${leftOut}`, async () => {
  const text = readFileSync(new URL('../../examples/fernhollow/spec.yaml', import.meta.url), 'utf8')
  const findPages = await officePages()
  const bytes = await writeSubmittal(sizeSpec(text), documentOptions('US'), { findPages })
  const document = strFromU8(unzipSync(bytes)['word/document.xml'] ?? new Uint8Array())
  const entries = (document.match(/<w:p>.*?<\/w:p>/gs) ?? [])
    .filter((paragraph) => /w:pStyle w:val="TOC[12]"/.test(paragraph))
    .map((paragraph) => [...paragraph.matchAll(/<w:t [^>]*>([^<]*)</g)].map(([, words = '']) => words))
  expect(entries.length).toBeGreaterThan(8)
  const printed = new Map(outline(convert('submittal.docx', bytes, 'pdf')))
  expect(entries).toEqual(entries.map(([title = '']) => [title, String(printed.get(oneSpaced(title)))]))
})

it.skipIf(!hasOffice)(`the PDF is a print of the document, the same each time${leftOut}`, async () => {
  const text = readFileSync(new URL('../../examples/alder-court/spec.yaml', import.meta.url), 'utf8')
  const office = await openOffice()
  const printed = () =>
    printSubmittal(sizeSpec(text), documentOptions('SI'), (docx) => office?.print(docx) ?? Promise.reject(new Error()))
  const first = await printed()
  expect([first.noPages, first.noPdf]).toEqual([null, null])
  // The same headings on the same pages as the document itself, laid out once more.
  expect(outline(first.pdf ?? new Uint8Array())).toEqual(outline(convert('submittal.docx', first.docx, 'pdf')))
  expect(outline(first.pdf ?? new Uint8Array()).length).toBeGreaterThan(8)
  const second = await printed()
  expect(Buffer.from(second.docx).equals(first.docx)).toBe(true)
  expect(Buffer.from(second.pdf ?? new Uint8Array()).equals(first.pdf ?? new Uint8Array())).toBe(true)
})

it.skipIf(!hasOffice)(`a review copy opens with every redline and answer as a comment${leftOut}`, async () => {
  const text = readFileSync(new URL('../../examples/fernhollow/spec.yaml', import.meta.url), 'utf8')
  const options = reviewedOptions('US', 'Issued for review')
  const opened = unzipSync(convert('review.docx', await writeReviewCopy(sizeSpec(text), options), 'odt'))
  const content = strFromU8(opened['content.xml'] ?? new Uint8Array())
  const comments = content.match(/<office:annotation .*?<\/office:annotation>/gs) ?? []
  const messages = (options.redlines ?? []).flatMap((redline) => redline.messages)
  expect(comments).toHaveLength(messages.length)
  for (const { author } of messages) expect(content).toContain(`<dc:creator>${author.name}</dc:creator>`)
})
