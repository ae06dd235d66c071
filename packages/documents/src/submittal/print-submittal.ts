import type { ProjectResult } from '@coldfill/sizing'
import { dateOf, type DocumentOptions } from '../document-options.ts'
import type { PageFinder } from '../pages/page-tokens.ts'
import { pdfDestinations } from '../pages/pdf-destinations.ts'
import { settledPdf } from '../pages/settled-pdf.ts'
import { writeSubmittal } from './write-submittal.ts'

export interface PrintedSubmittal {
  readonly docx: Uint8Array
  /** Null where it could not be printed. */
  readonly pdf: Uint8Array | null
  /** Why the contents list has no page numbers; null where it has them. */
  readonly noPages: string | null
  /** Why there is no PDF; null where there is one. */
  readonly noPdf: string | null
}

/** What printing goes through: laying out to find the pages, then the print of the finished file. */
export type PrintStage = 'pages' | 'pdf'

const samePages = (a: ReadonlyMap<string, number>, b: ReadonlyMap<string, number>): boolean =>
  a.size === b.size && [...a].every(([anchor, page]) => b.get(anchor) === page)

/**
 * The submittal as a .docx file with page numbers, and the print of that very file as a PDF. The numbers are compared with the
 * pages of the print: where writing them moved a heading they are put in once more, and left out where they still do not agree.
 * `print` lays a .docx file out as a PDF; where it fails, the document comes without what it would have given.
 */
export const printSubmittal = async (
  result: ProjectResult,
  options: DocumentOptions,
  print: (docx: Uint8Array) => Promise<Uint8Array>,
  onStage: (stage: PrintStage) => void = () => undefined,
): Promise<PrintedSubmittal> => {
  let noPages: string | null = null
  let pages: ReadonlyMap<string, number> | null = null
  const write = (finder: PageFinder | null): Promise<Uint8Array> =>
    writeSubmittal(result, options, {
      findPages: finder && (async (laidOut) => (pages = await finder(laidOut))),
      onNoPages: (why) => {
        noPages = why
      },
    })

  let docx = await write(async (laidOut) => {
    onStage('pages')
    return pdfDestinations(await print(laidOut))
  })
  // Where it could not be laid out there is no use in trying again.
  if (pages === null) return { docx, pdf: null, noPages, noPdf: noPages }
  onStage('pdf')
  try {
    let pdf = await print(docx)
    const agrees = (): boolean => noPages !== null || (pages !== null && samePages(pages, pdfDestinations(pdf)))
    if (!agrees()) {
      const found = pdfDestinations(pdf)
      docx = await write(() => Promise.resolve(found))
      pdf = await print(docx)
    }
    if (!agrees()) {
      noPages = 'The pages moved each time that their numbers were written.'
      docx = await write(null)
      pdf = await print(docx)
    }
    return { docx, pdf: settledPdf(pdf, dateOf(options.titleBlock)), noPages, noPdf: null }
  } catch (error) {
    return { docx, pdf: null, noPages, noPdf: error instanceof Error ? error.message : String(error) }
  }
}
