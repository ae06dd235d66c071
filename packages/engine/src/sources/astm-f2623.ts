import type { Source } from '../citation.ts'

export const astmF2623: Source = {
  id: 'astm-f2623',
  title: 'Standard specification for polyethylene of raised temperature (PE-RT) SDR 9 tubing',
  publisher: 'ASTM International',
  edition: 'ASTM F2623, edition not recorded',
  year: null,
}
