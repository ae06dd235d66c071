import type { Source } from '../citation.ts'

export const verificationEvaluation: Source = {
  id: 'verification-evaluation',
  title: 'Evaluation of the cited equation apart from this program, with IAPWS-IF97 volumes',
  publisher: 'none',
  edition: 'none',
  year: null,
}
