import { expect, it } from 'vitest'
import { composeMail } from './compose-mail.ts'

const content = {
  event: 'review asked',
  subject: 'T-1\r\nBcc: somebody',
  action: 'Do <b>this</b> & that.',
  lines: ['Because "why".'],
  link: { title: 'Open it', path: '/p/T-1/redlines?thread=3' },
}

it('puts what is to be done first, and a link to the exact place last', () => {
  const { text, html } = composeMail(content, 'https://office.example:8443')
  expect(text).toBe(
    'Do <b>this</b> & that.\n\nBecause "why".\n\nOpen it: https://office.example:8443/p/T-1/redlines?thread=3\n',
  )
  expect(html).toContain('<strong>Do &lt;b&gt;this&lt;/b&gt; &amp; that.</strong>')
  expect(html).toContain('<p>Because &quot;why&quot;.</p>')
})

it('keeps the subject on one line', () => {
  expect(composeMail(content, 'http://localhost').subject).toBe('T-1 Bcc: somebody')
})
