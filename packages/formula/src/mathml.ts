import type { Box } from './box.ts'

const escaped = (text: string): string => text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`)

const element = (name: string, ...parts: string[]): string => `<${name}>${parts.join('')}</${name}>`

const bracket = (text: string, form: 'prefix' | 'postfix'): string =>
  `<mo fence="true" form="${form}" stretchy="true">${text}</mo>`

const drawn = (box: Box): string => {
  switch (box.box) {
    case 'row':
      return element('mrow', ...box.items.map(drawn))
    case 'identifier':
      return element('mi', escaped(box.text))
    case 'word':
      return element('mtext', escaped(box.text))
    case 'number':
      return element('mn', escaped(box.text))
    case 'operator':
      return element('mo', escaped(box.text))
    case 'fraction':
      return element('mfrac', drawn(box.top), drawn(box.bottom))
    case 'subscript':
      return element('msub', drawn(box.base), drawn(box.sub))
    case 'superscript':
      return element('msup', drawn(box.base), drawn(box.sup))
    case 'radical':
      return element('msqrt', drawn(box.inside))
    case 'fence':
      return element('mrow', bracket(box.open, 'prefix'), drawn(box.inside), bracket(box.close, 'postfix'))
    case 'cases':
    default: {
      const lines = box.cases.map(({ value, condition }) => {
        const when = condition
          ? element('mrow', element('mtext', 'if\u00A0'), drawn(condition))
          : element('mtext', 'otherwise')
        return element('mtr', element('mtd', drawn(value)), element('mtd', when))
      })
      return element('mrow', bracket('{', 'prefix'), element('mtable', ...lines))
    }
  }
}

/** MathML Core, escaped: fit for an HTML page and for an XML file. `display` sets it on a line of its own. */
export const toMathML = (box: Box, { display = false }: { display?: boolean } = {}): string =>
  `<math xmlns="http://www.w3.org/1998/Math/MathML" display="${display ? 'block' : 'inline'}">${drawn(box)}</math>`
