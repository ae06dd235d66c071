import { BuilderElement, MathRun, type ParagraphChild, type XmlComponent } from 'docx'
import type { Box } from '@coldfill/formula'
import { inParagraph } from './xml-element.ts'

/** An Office Math element with its children. */
const element = (name: string, children: readonly XmlComponent[] = []): XmlComponent =>
  new BuilderElement({ name: `m:${name}`, children })

const property = (name: string, value: string): XmlComponent =>
  new BuilderElement<{ value: string }>({ name: `m:${name}`, attributes: { value: { key: 'm:val', value } } })

const arg = (name: 'e' | 'num' | 'den' | 'sub' | 'sup', box: Box): XmlComponent => element(name, ommlOf(box))

/** Upright text in the document's font. LibreOffice reads words such as `in` or `over` inside an equation as commands unless they are normal text. */
const upright = (text: string): XmlComponent => new MathRun({ text, normalText: true })

/** `m/s2` behind a number becomes `m/s²`. */
const raisedUnit = (text: string): string =>
  text.startsWith('\u00A0') ? text.replace(/(?<=[a-z])[23](?!\w)/g, (power) => (power === '2' ? '²' : '³')) : text

const fenced = (open: string, close: string, inside: readonly XmlComponent[]): XmlComponent =>
  element('d', [element('dPr', [property('begChr', open), property('endChr', close)]), element('e', inside)])

/** A drawn formula as elements of a native Word equation. Brackets come from the boxes; none is added here. */
export const ommlOf = (box: Box): XmlComponent[] => {
  switch (box.box) {
    case 'row':
      return box.items.flatMap(ommlOf)
    case 'identifier':
      return [new MathRun(box.text)]
    case 'number':
      return [new MathRun({ text: box.text, style: 'plain' })]
    case 'word':
      return [upright(raisedUnit(box.text))]
    case 'operator':
      return [new MathRun({ text: box.text, style: 'plain' })]
    case 'fraction':
      return [element('f', [arg('num', box.top), arg('den', box.bottom)])]
    case 'subscript':
      return [element('sSub', [arg('e', box.base), arg('sub', box.sub)])]
    case 'superscript':
      return [element('sSup', [arg('e', box.base), arg('sup', box.sup)])]
    case 'radical':
      return [element('rad', [element('radPr', [property('degHide', '1')]), element('deg'), arg('e', box.inside)])]
    case 'fence':
      return [fenced(box.open, box.close, ommlOf(box.inside))]
    case 'cases':
    default:
      return [
        fenced('{', '', [
          element(
            'eqArr',
            box.cases.map(({ value, condition }) =>
              element('e', [
                ...ommlOf(value),
                ...(condition === null ? [upright('  otherwise')] : [upright('  if '), ...ommlOf(condition)]),
              ]),
            ),
          ),
        ]),
      ]
  }
}

/** An equation among words. */
export const inlineEquation = (box: Box): ParagraphChild => inParagraph(element('oMath', ommlOf(box)))

/** An equation on its own line, set from the left. */
export const displayEquation = (box: Box): ParagraphChild =>
  inParagraph(element('oMathPara', [element('oMathParaPr', [property('jc', 'left')]), element('oMath', ommlOf(box))]))
