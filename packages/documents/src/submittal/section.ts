import type { ProjectResult } from '@coldfill/sizing'
import type { FileChild } from 'docx'
import type { DocumentOptions } from '../document-options.ts'
import type { ReviewComments } from '../docx/review-comments.ts'
import type { Headings } from '../docx/paragraph.ts'
import type { scheduleWords } from '../schedules/schedule-words.ts'
import type { Captions } from '../docx/captions.ts'
import type { Pictures } from './pictures.ts'

/** What every section of a submittal is written from. */
export interface SubmittalContext {
  readonly result: ProjectResult
  readonly options: DocumentOptions
  readonly headings: Headings
  readonly captions: Captions
  /** Says a number of a vessel in the digits of its schedule. */
  readonly shown: ReturnType<typeof scheduleWords>
  readonly pictures: Pictures
  /** Redlines to put on their places; null where the file has none. */
  readonly comments: ReviewComments | null
  /** Width of the text in twips. */
  readonly width: number
}

export type Section = (context: SubmittalContext) => FileChild[]
