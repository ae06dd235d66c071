import type { UnitSystem } from '@coldfill/units'
import type { DocumentOptions } from '../document-options.ts'

/** Options of an invented issue, for tests. */
export const documentOptions = (units: UnitSystem, status = 'Issued for review'): DocumentOptions => ({
  units,
  titleBlock: {
    office: 'Tarn & Vale Engineers',
    preparedBy: 'A. Rowan',
    checkedBy: 'B. Lark',
    date: '2026-12-01',
    revision: 'A',
    status,
  },
  revisions: [
    { revision: 'A', date: '2026-12-01', purpose: 'Relief setting of the heating loop changed', by: 'A. Rowan' },
    { revision: '', date: '2026-11-14', purpose: 'Issued for review', by: 'A. Rowan' },
  ],
  contentHash: 'a3f5c0de9b7d41e2a3f5c0de9b7d41e2a3f5c0de9b7d41e2a3f5c0de9b7d41e2',
})
