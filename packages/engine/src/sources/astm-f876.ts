import type { Source } from '../citation.ts'

export const astmF876: Source = {
  id: 'astm-f876',
  title: 'Standard specification for crosslinked polyethylene (PEX) tubing',
  publisher: 'ASTM International',
  edition: 'ASTM F876, edition not recorded',
  year: null,
}
