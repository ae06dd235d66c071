import type { ProjectResult } from '@coldfill/sizing'
import type { FileChild } from 'docx'
import type { DocumentOptions } from '../document-options.ts'
import type { Headings } from '../docx/paragraph.ts'
import type { Captions } from '../docx/table.ts'

/** What every section of a submittal is written from. */
export interface SubmittalContext {
  readonly result: ProjectResult
  readonly options: DocumentOptions
  readonly headings: Headings
  readonly captions: Captions
  /** Width of the text in twips. */
  readonly width: number
}

export type Section = (context: SubmittalContext) => FileChild[]
