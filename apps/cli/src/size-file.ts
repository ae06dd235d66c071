import { type ProjectResult, sizeSpec } from '@coldfill/sizing'
import { readCatalogueOption } from './catalogue-file.ts'
import { readText } from './io.ts'

export interface SizedFile {
  readonly file: string
  readonly text: string
  readonly result: ProjectResult
  /** False where the text could not be read as a spec at all. */
  readonly read: boolean
}

/** Reads a spec file and sizes it. */
export const sizeFile = async (file: string, cataloguePath?: string): Promise<SizedFile> =>
  sizeText(file, readText(file), cataloguePath)

/** Sizes a text that was read from a file. */
export const sizeText = async (file: string, text: string, cataloguePath?: string): Promise<SizedFile> => {
  const catalogue = await readCatalogueOption(cataloguePath)
  const result = sizeSpec(text, catalogue ? { catalogue } : {})
  return { file, text, result, read: result.readable }
}
