import { expect, it } from 'vitest'
import { PutTitleBlockRequest } from './title-block.ts'

const request = {
  name: ' Sill & Marrow ',
  lines: ['14 Weir Lane', ' ', 'Oxbow'],
  captions: { prepared: 'Prepared', checked: 'Checked', approved: 'Approved' },
  paper: 'A4',
}

it('takes off blanks and leaves out empty lines', () => {
  expect(PutTitleBlockRequest.parse(request)).toMatchObject({ name: 'Sill & Marrow', lines: ['14 Weir Lane', 'Oxbow'] })
})

it('refuses what would not be one line of a document', () => {
  for (const text of ['a\nb', 'a\u0007b', 'a\rb'])
    expect(PutTitleBlockRequest.safeParse({ ...request, lines: [text] }).success).toBe(false)
  expect(PutTitleBlockRequest.safeParse({ ...request, captions: { ...request.captions, checked: '' } }).success).toBe(
    false,
  )
})
