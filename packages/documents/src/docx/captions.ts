import { Paragraph, type ParagraphChild } from 'docx'
import { asParagraphChildren, bookmarked, fieldRuns, textRun } from './field.ts'
import { plainText } from './plain-text.ts'
import { STYLE } from './styles.ts'

type Label = 'Table' | 'Figure'

export interface CaptionEntry {
  readonly label: Label
  /** `Table 3. Assumptions` */
  readonly text: string
  readonly anchor: string
}

/** Bookmarks of captions and references are numbered apart from those of headings. */
const [CAPTION_IDS, REFERENCE_IDS] = [200_000, 300_000]

/**
 * Numbers the tables and figures of a document; a caption stands above a table and below a figure. Words elsewhere refer to one by
 * the key it was captioned under, also before it.
 */
export class Captions {
  readonly entries: CaptionEntry[] = []
  readonly #counts: Record<Label, number> = { Table: 0, Figure: 0 }
  readonly #anchors = new Map<string, string>()
  readonly #names = new Map<string, string>()

  next(text: string, key?: string): Paragraph {
    return this.#caption('Table', text, key)
  }

  figure(text: string, key?: string): Paragraph {
    return this.#caption('Figure', text, key)
  }

  /** `Table 3` as a field that follows the numbering. A key that nothing is captioned under throws when the file is written. */
  reference(key: string): ParagraphChild[] {
    const name = (): string => {
      const found = this.#names.get(key)
      if (found === undefined) throw new Error(`nothing is captioned ${key}`)
      return found
    }
    return asParagraphChildren(fieldRuns(`REF ${this.#anchor(key)} \\h`, name))
  }

  #anchor(key: string): string {
    const known = this.#anchors.get(key)
    if (known !== undefined) return known
    const anchor = `_Ref${String(REFERENCE_IDS + this.#anchors.size)}`
    this.#anchors.set(key, anchor)
    return anchor
  }

  #caption(label: Label, text: string, key: string | undefined): Paragraph {
    const number = (this.#counts[label] += 1)
    const id = CAPTION_IDS + this.entries.length
    const anchor = `_Toc${id}`
    this.entries.push({ label, text: plainText(`${label} ${number}. ${text}`), anchor })
    const numbered = [textRun(`${label} `), ...fieldRuns(`SEQ ${label} \\* ARABIC`, String(number))]
    if (key !== undefined) this.#names.set(key, `${label} ${number}`)
    return new Paragraph({
      style: label === 'Table' ? 'Caption' : STYLE.figureCaption,
      children: asParagraphChildren(
        bookmarked(anchor, id, [
          ...(key === undefined ? numbered : bookmarked(this.#anchor(key), id + REFERENCE_IDS, numbered)),
          textRun(plainText(`. ${text}`)),
        ]),
      ),
    })
  }
}
