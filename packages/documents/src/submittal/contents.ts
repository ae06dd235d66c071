import { Paragraph, TableOfContents, TextRun, type FileChild } from 'docx'
import type { Headings } from '../docx/paragraph.ts'

/**
 * The contents list as a field with its entries written out, so that it is complete before any program updates it and
 * no program asks to. It is written last, when every heading is known, and stands before them.
 */
export const contents = (headings: Headings): FileChild[] => [
  new Paragraph({ style: 'TOCHeading', children: [new TextRun('Contents')] }),
  // Entries have no page numbers, so nothing leads the eye to where they would stand.
  new TableOfContents('Contents', {
    tabLeader: 'none',
    hyperlink: true,
    headingStyleRange: '1-2',
    pageNumbersEntryLevelsRange: '1-2',
    beginDirty: false,
    cachedEntries: headings.entries
      .filter((entry) => entry.level <= 2)
      .map(({ text, level, anchor }) => ({ title: text, level, href: anchor })),
  }),
]
