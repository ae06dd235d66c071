import { strFromU8, unzipSync } from 'fflate'
import type TestAgent from 'supertest/lib/agent.js'
import { binaryBody } from './binary-body.ts'

/** Bytes of a file as a person downloads it. */
export const download = async (agent: TestAgent, href: string): Promise<Buffer> =>
  (await agent.get(href).buffer(true).parse(binaryBody).expect(200)).body as Buffer

/** The XML of a part of an Office file; empty where there is no such part. */
export const partOf = (bytes: Uint8Array, name: string): string => strFromU8(unzipSync(bytes)[name] ?? new Uint8Array())

/** The words of a .docx file, one paragraph or cell a line. */
export const wordsOf = (docx: Uint8Array): string =>
  partOf(docx, 'word/document.xml')
    .replace(/<\/w:(?:p|tc)>/g, '\n')
    .replace(/<[^>]+>/g, '')
    .replaceAll('&amp;', '&')
