/** Page on which each bookmark of a .docx file stands, counted from 1. */
export type PageFinder = (docx: Uint8Array) => Promise<ReadonlyMap<string, number>>

/** Stands where a page number will, until it is known. */
export const pageToken = (anchor: string): string => `{page of ${anchor}}`

const TOKEN = /\{page of (_Toc\d+)\}/g

/** Puts page numbers in the places of the tokens. */
export const withPages = (xml: string, page: (anchor: string) => string): string =>
  xml.replace(TOKEN, (_, anchor: string) => page(anchor))
