import { paragraph } from '../docx/paragraph.ts'
import { STYLE } from '../docx/styles.ts'
import { cautions as sentences } from '../words/cautions.ts'
import type { Section } from './section.ts'

export const cautions: Section = ({ headings }) => [
  headings.heading('Cautions', 1),
  ...sentences.map((sentence) => paragraph(sentence, STYLE.caution)),
]
