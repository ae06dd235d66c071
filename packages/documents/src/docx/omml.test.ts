import { equationBox, formulaTree, layout, layoutSymbol, type Box } from '@coldfill/formula'
import { Document, Packer, Paragraph } from 'docx'
import { strFromU8, unzipSync } from 'fflate'
import { describe, expect, it } from 'vitest'
import { displayEquation } from './omml.ts'

/** The equation as it stands in the file. */
const written = async (box: Box): Promise<string> => {
  const document = new Document({ sections: [{ children: [new Paragraph({ children: [displayEquation(box)] })] }] })
  const parts = unzipSync(new Uint8Array(await Packer.toArrayBuffer(document)))
  return /<m:oMathPara>.*<\/m:oMathPara>/s.exec(strFromU8(parts['word/document.xml'] ?? new Uint8Array()))?.[0] ?? ''
}
const drawn = (text: string): Promise<string> => written(layout(formulaTree(text)))

/** Text of the equation without its structure. */
const textOf = (xml: string): string => [...xml.matchAll(/<m:t[^>]*>([^<]*)<\/m:t>/g)].map(([, text]) => text).join('')

describe('a native Word equation', () => {
  it('sets fractions, subscripts and brackets as structure', async () => {
    const xml = await written(equationBox(layoutSymbol('V_t'), layout(formulaTree('V_e / (1 - P_1 / P_2)'))))
    expect(xml.match(/<m:f>/g)).toHaveLength(2)
    expect(xml.match(/<m:sSub>/g)).toHaveLength(4)
    expect(xml).not.toContain('<m:d>')
    expect(textOf(xml)).toBe('Vt=Ve1−P1P2')
  })

  it('brackets only what the drawing says', async () => {
    expect(await drawn('(a + b) * c')).toMatch(/<m:d><m:dPr><m:begChr m:val="\("\/><m:endChr m:val="\)"\/><\/m:dPr>/)
    expect(await drawn('a + b * c')).not.toContain('<m:d>')
    expect(await drawn('abs(a)')).toContain('<m:begChr m:val="|"/>')
  })

  it('sets powers and roots', async () => {
    expect(await drawn('d ^ 2')).toMatch(/<m:sSup><m:e>.*<\/m:e><m:sup>.*<\/m:sup><\/m:sSup>/)
    expect(await drawn('sqrt(a)')).toMatch(/<m:rad><m:radPr><m:degHide m:val="1"\/><\/m:radPr><m:deg\/><m:e>/)
  })

  // LibreOffice reads such words as commands of its own equation language unless they are normal text.
  it.each(['in', 'to', 'over', 'bar', 'lim', 'size', 'from'])('writes the word "%s" as normal text', async (text) => {
    expect(await written({ box: 'word', text })).toMatch(
      new RegExp(`<m:rPr><m:nor m:val="1"/></m:rPr><m:t[^>]*>${text}</m:t>`),
    )
  })

  it('writes one line a case', async () => {
    const xml = await drawn('when(a > b, a, b)')
    expect(xml).toMatch(/<m:begChr m:val="\{"\/><m:endChr m:val=""\/>/)
    expect(xml).toMatch(/<m:eqArr><m:e>.*<\/m:e><m:e>.*otherwise.*<\/m:e><\/m:eqArr>/)
  })

  it('raises the powers of a unit behind a number', async () => {
    expect(textOf(await drawn('9.80665[m/s2] * h'))).toContain('m/s²')
  })
})
