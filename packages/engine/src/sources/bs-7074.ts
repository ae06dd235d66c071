import type { Source } from '../citation.ts'

export const bs7074: Source = {
  id: 'bs-7074',
  title: 'Application, selection and installation of expansion vessels and ancillary equipment',
  publisher: 'BSI',
  edition: 'BS 7074:1989, parts 1 to 3',
  year: 1989,
}
