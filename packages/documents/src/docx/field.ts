import type { ParagraphChild, XmlComponent } from 'docx'
import { inParagraph, xmlElement } from './xml-element.ts'

const run = (children: readonly XmlComponent[]): XmlComponent => xmlElement('w:r', {}, children)

export const textElement = (text: string | (() => string)): XmlComponent =>
  xmlElement('w:t', { 'xml:space': 'preserve' }, [text])

const mark = (type: 'begin' | 'separate' | 'end'): XmlComponent =>
  run([xmlElement('w:fldChar', { 'w:fldCharType': type })])

export const fieldBegin = (instruction: string): XmlComponent[] => [
  mark('begin'),
  run([xmlElement('w:instrText', { 'xml:space': 'preserve' }, [` ${instruction} `])]),
  mark('separate'),
]

export const fieldEnd = (): XmlComponent => mark('end')

/** A field with the text that is shown until a program updates it. */
export const fieldRuns = (instruction: string, cached: string | (() => string)): XmlComponent[] => [
  ...fieldBegin(instruction),
  run([textElement(cached)]),
  fieldEnd(),
]

export const bookmarked = (name: string, id: number, children: readonly XmlComponent[]): XmlComponent[] => [
  xmlElement('w:bookmarkStart', { 'w:id': String(id), 'w:name': name }),
  ...children,
  xmlElement('w:bookmarkEnd', { 'w:id': String(id) }),
]

export const textRun = (text: string): XmlComponent => run([textElement(text)])
export const tabRun = (): XmlComponent => run([xmlElement('w:tab')])

export const asParagraphChildren = (components: readonly XmlComponent[]): ParagraphChild[] =>
  components.map(inParagraph)
