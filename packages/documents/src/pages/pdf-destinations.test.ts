import { describe, expect, it } from 'vitest'
import { pdfDestinations } from './pdf-destinations.ts'

const pdf = (text: string) => new TextEncoder().encode(text)

describe('named places of a PDF', () => {
  it('are on the page whose object they name, in the order of the page tree', () => {
    const pages = pdfDestinations(
      pdf(
        '9 0 obj\n<</Type/Pages\n/Resources 3 0 R\n/Kids[ 7 0 R 4 0 R ]\n/Count 2>>\n10 0 obj\n<</5FToc100000[4 0 R/XYZ 65 477 0]\n/#5FToc100001[7 0 R/XYZ 1 2 0]/Other[7 0 R/XYZ 1 2 0]>>',
      ),
    )
    expect([...pages]).toEqual([
      ['_Toc100000', 2],
      ['_Toc100001', 1],
    ])
  })

  it('are none in a file that hides them', () => {
    expect(pdfDestinations(pdf('%PDF-1.7 stream xyz')).size).toBe(0)
  })
})
