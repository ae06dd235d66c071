import { type Office, OfficeFailure, openOffice } from '@coldfill/documents/office'
import { describeError } from '../describe-error.ts'
import type { Log } from '../log.ts'

/** Prints documents as PDF with the LibreOffice of this machine, where there is one. */
export interface Printer {
  /** Why nothing can be printed, in words for people; null where it can. */
  missing(): Promise<string | null>
  /** @throws with words for people */
  print(docx: Uint8Array, signal: AbortSignal): Promise<Uint8Array>
}

const NOT_INSTALLED = 'LibreOffice is not installed on the server.'

/** `command` starts LibreOffice; `none` uses no LibreOffice. One that is installed later is found without a restart. */
export const createPrinter = (command: string, log: Log): Printer => {
  let found: Office | null = null
  const missing = async (): Promise<string | null> => {
    if (command === 'none') return 'The server is set to work without LibreOffice.'
    found ??= await openOffice(command)
    return found ? null : NOT_INSTALLED
  }
  return {
    missing,
    print: async (docx, signal) => {
      if (!found) throw new Error((await missing()) ?? NOT_INSTALLED)
      try {
        return await found.print(docx, signal)
      } catch (error) {
        if (!signal.aborted) log.error(`printing with ${command}: ${describeError(error)}`)
        if (error instanceof OfficeFailure) throw error
        // What the system says of it is for the log.
        throw new Error('The server could not run LibreOffice.', { cause: error })
      }
    },
  }
}
