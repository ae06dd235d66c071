import { type ProjectResult, sizeSpec } from '@coldfill/sizing'
import { readText } from './io.ts'

export interface SizedFile {
  readonly file: string
  readonly text: string
  readonly result: ProjectResult
  /** False where the text could not be read as a spec at all. */
  readonly read: boolean
}

/** Reads a spec file and sizes it. */
export const sizeFile = (file: string): SizedFile => {
  const text = readText(file)
  const result = sizeSpec(text)
  return { file, text, result, read: result.readable }
}
