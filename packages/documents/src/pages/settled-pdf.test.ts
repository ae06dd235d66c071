import { expect, it } from 'vitest'
import { settledPdf } from './settled-pdf.ts'

const pdf = (time: string, id: string, words = 'text'): Uint8Array =>
  Buffer.from(
    `%PDF ${words}\xff /CreationDate(D:${time}Z')>> /ID [ <${id}>\n<${id}> ]\n/DocChecksum /${id}\n%%EOF`,
    'latin1',
  )
const first = pdf('20310102030405', 'A'.repeat(32))
const date = new Date('2026-03-02T00:00:00Z')

it('is the same whenever it was printed, and as long as before', () => {
  const settled = settledPdf(first, date)
  expect(settledPdf(pdf('19991231235959', 'B'.repeat(32)), date)).toEqual(settled)
  expect(settled).toHaveLength(first.length)
  expect(Buffer.from(settled).toString('latin1')).toContain(
    '%PDF text\xff /CreationDate(D:20260302000000Z)'.slice(0, -1),
  )
})

it('has another identifier with another content', () => {
  const idOf = (bytes: Uint8Array) => /<([0-9A-F]{32})>/.exec(Buffer.from(bytes).toString('latin1'))?.[1]
  expect(idOf(settledPdf(pdf('20310102030405', 'A'.repeat(32), 'book'), date))).not.toBe(idOf(settledPdf(first, date)))
})
