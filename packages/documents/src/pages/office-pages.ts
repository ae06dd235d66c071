import { type Office, openOffice } from './office.ts'
import type { PageFinder } from './page-tokens.ts'
import { pdfDestinations } from './pdf-destinations.ts'

/** Finds page numbers by printing. */
export const pagesBy =
  (office: Office): PageFinder =>
  async (docx) =>
    pdfDestinations(await office.print(docx))

/**
 * Finds page numbers with the LibreOffice of this machine; null where `command` is not installed. `timeout` in ms bounds
 * one laying out; when it passes, the promise rejects.
 */
export const officePages = async (command = 'soffice', timeout = 90_000): Promise<PageFinder | null> => {
  const office = await openOffice(command, timeout)
  return office && pagesBy(office)
}
