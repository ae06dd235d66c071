import {
  CommentRangeEnd,
  CommentRangeStart,
  CommentReference,
  Paragraph,
  TextRun,
  type ICommentsOptions,
  type ParagraphChild,
} from 'docx'
import type { RedlineAnchor, RedlineEntry } from '../document-options.ts'
import { redlineAsks } from '../words/redline-words.ts'
import { sentenceCase } from '@coldfill/presentation'
import { plainText } from './plain-text.ts'

interface Thread {
  readonly redline: RedlineEntry
  /** Comment ids: the redline, then its answers. */
  readonly ids: readonly number[]
}

/** Redlines as comments of a word processor, one thread a redline; each is placed once, where it is first asked for. */
export class ReviewComments {
  readonly #threads: readonly Thread[]
  readonly #placed = new Set<Thread>()

  constructor(redlines: readonly RedlineEntry[]) {
    let next = 0
    this.#threads = redlines.map((redline) => ({
      redline,
      ids: redline.messages.map(() => {
        next += 1
        return next
      }),
    }))
  }

  /** Ids of the comments that belong where `stands` says so and have no place yet. */
  place(stands: (anchor: RedlineAnchor, number: number) => boolean): number[] {
    return this.#threads.flatMap((thread) => {
      if (this.#placed.has(thread) || !stands(thread.redline.anchor, thread.redline.number)) return []
      this.#placed.add(thread)
      return thread.ids
    })
  }

  /** For the document: every thread, answers under their redline, closed ones resolved. */
  options(): ICommentsOptions {
    return {
      children: this.#threads.flatMap(({ redline, ids }) =>
        redline.messages.map(({ author, at, text }, index) => {
          const asks = index === 0 ? redlineAsks(redline) : ''
          return {
            id: ids[index] ?? 0,
            author: plainText(author.name),
            initials: plainText(author.initials),
            date: new Date(at),
            ...(index > 0 && ids[0] !== undefined ? { parentId: ids[0] } : {}),
            ...(redline.state === 'closed' ? { resolved: true } : {}),
            children: [
              new Paragraph({ children: [new TextRun(plainText(text))] }),
              ...(asks === '' ? [] : [new Paragraph({ children: [new TextRun(plainText(`${sentenceCase(asks)}.`))] })]),
            ],
          }
        }),
      ),
    }
  }
}

/** Words with comments on them. */
export const commented = (ids: readonly number[], words: readonly ParagraphChild[]): ParagraphChild[] => [
  ...ids.map((id) => new CommentRangeStart(id)),
  ...words,
  ...ids.flatMap((id) => [new CommentRangeEnd(id), new TextRun({ children: [new CommentReference(id)] })]),
]
