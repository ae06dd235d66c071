import * as documents from '@coldfill/documents'
import { expect, it } from 'vitest'
import { CONSTRUCTION_STATUS } from './document-options.ts'

it('says the status in the words by which the documents leave out the draft warning', () => {
  expect(CONSTRUCTION_STATUS).toBe(documents.CONSTRUCTION_STATUS)
})
