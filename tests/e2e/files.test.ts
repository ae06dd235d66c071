import { createHash } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { strFromU8, unzipSync } from 'fflate'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { hasOffice, leftOut } from '../office/office.ts'
import { launchBrowser } from './browser.ts'
import { type Person, picture, signIn } from './person.ts'
import { serve, type Served } from './serve.ts'

/** What goes into the files of an issue and comes out of them, with the LibreOffice of this machine. The steps follow each other. */
let served: Served
let browser: Browser
let consultant: Person
let reviewer: Person
let administrator: Person

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve({ COLDFILL_OFFICE: '' }), launchBrowser()])
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

/** A grey PNG of 64 × 32 pixels, written by hand after the specification and packed. */
const LOGO = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAEAAAAAgCAAAAACH9iFYAAAAH0lEQVR42mNooBAwjBowasCoAaMGjBowasCoAcPNAAD74AA9L8UprQAAAABJRU5ErkJggg==',
  'base64',
)

const download = async (page: Page, name: RegExp): Promise<Buffer> => {
  const waiting = page.waitForEvent('download')
  await page.getByRole('link', { name }).first().click()
  return readFile(await (await waiting).path())
}
const partOf = (bytes: Buffer, name: string): string =>
  strFromU8(unzipSync(new Uint8Array(bytes))[name] ?? new Uint8Array())
const wordsOf = (docx: Buffer): string => partOf(docx, 'word/document.xml').replace(/<[^>]+>/gu, '\n')

it('the administrator sets the title block, and a file that is no picture is refused', async () => {
  administrator = await signIn(browser, served.address, 'admin@demo.example')
  const { page } = administrator
  await page.goto('/office')
  await page.getByRole('tab', { name: 'Title block' }).click()
  const logo = page.getByLabel('Logo file, PNG or JPEG')
  await logo.setInputFiles({ name: 'logo.png', mimeType: 'image/png', buffer: Buffer.from('no picture') })
  await page.getByText('It is neither a PNG nor a JPEG.').waitFor()
  await logo.setInputFiles({ name: 'logo.png', mimeType: 'image/png', buffer: LOGO })
  await page.getByText('64 × 32 pixels').waitFor()
  await expect
    .poll(() =>
      page.getByRole('img', { name: 'Logo of the office' }).evaluate((img) => (img as HTMLImageElement).naturalWidth),
    )
    .toBe(64)
  await page.getByLabel('Address and contact').fill('14 Weir Lane, Oxbow')
  await page.getByLabel('Who issues it for construction').fill('Engineer of record')
  await page.getByRole('button', { name: 'Save' }).click()
  await page.getByText('Nothing is changed.').waitFor()
  await picture(page, '40-title-block')
})

it('the consultant picks the contents and issues', async () => {
  consultant = await signIn(browser, served.address, 'consultant@demo.example')
  const { page } = consultant
  await page.goto('/p/FC-241/issue')
  const contents = page.getByRole('group', { name: 'Contents of the files for review' })
  await contents.getByRole('radio', { name: 'SI' }).click()
  await contents.getByLabel(/^Verification/u).check()
  await page.getByRole('button', { name: 'Issue for review' }).click()
  const article = page.getByRole('article', { name: 'First issue' })
  await article.getByText('SI units, with verification').waitFor({ timeout: 120_000 })
  await picture(page, '41-issued-with-contents')

  const submittal = await download(page, /^Download .*submittal\.docx$/u)
  const words = wordsOf(submittal)
  for (const text of ['14 Weir Lane, Oxbow', 'Engineer of record', 'Cases with a known answer'])
    expect(words).toContain(text)
  expect(Object.values(unzipSync(new Uint8Array(submittal))).some((part) => LOGO.equals(part))).toBe(true)
})

it.skipIf(!hasOffice)(`the contents list has page numbers, and a PDF stands beside it${leftOut}`, async () => {
  const { page } = consultant
  const pdf = await download(page, /^Download .*submittal\.pdf$/u)
  expect(pdf.subarray(0, 5).toString()).toBe('%PDF-')
  const hash = createHash('sha256').update(pdf).digest('hex')
  await page.getByText(`SHA-256 ${hash}`).waitFor()
  const submittal = partOf(await download(page, /^Download .*submittal\.docx$/u), 'word/document.xml')
  const entries = (submittal.match(/<w:p>.*?<\/w:p>/gsu) ?? []).filter((entry) => entry.includes('w:val="TOC1"'))
  expect(entries.length).toBeGreaterThan(4)
  for (const entry of entries) expect(entry).toMatch(/<w:t [^>]*>\d+<\/w:t>/u)
})

it.skipIf(hasOffice)('the sheet says that there is no PDF, and why', async () => {
  await consultant.page.getByText('LibreOffice is not installed on the server.').waitFor()
})

it('the reviewer takes a review copy home with the redlines as comments', async () => {
  reviewer = await signIn(browser, served.address, 'reviewer@demo.example')
  const { page } = reviewer
  const headers = { 'X-Requested-With': 'coldfill' }
  const revision = (await (await page.request.get('/api/projects/FC-241/revisions/-')).json()) as {
    contentHash: string
  }
  const written = await page.request.post('/api/projects/FC-241/redlines', {
    headers,
    data: { anchor: { type: 'row', mark: 'ET-1' }, text: 'Is the roof coil in the height?' },
  })
  expect(written.status()).toBe(201)
  const review = await page.request.post('/api/projects/FC-241/revisions/-/reviews', {
    headers,
    data: { outcome: 'revise', reason: 'See the redline.', contentHash: revision.contentHash },
  })
  expect(review.status()).toBe(201)
  await page.goto('/p/FC-241/redlines')
  await page.getByRole('button', { name: 'Prepare a review copy' }).click()
  await page.getByRole('link', { name: /^Download .*review-copy\.docx$/u }).waitFor({ timeout: 60_000 })
  await page.getByText('1 redline as of').waitFor()
  await picture(page, '42-review-copy')
  const copy = await download(page, /^Download .*review-copy\.docx$/u)
  const comments = partOf(copy, 'word/comments.xml')
  expect(comments.replace(/<[^>]+>/gu, '')).toContain('Is the roof coil in the height?')
})

it('no sheet complained in the console of a browser', () => {
  expect([consultant, reviewer, administrator].flatMap(({ complaints }) => complaints)).toEqual([])
})

it('the server closes its database and ends well', async () => {
  expect(await served.stop()).toBe(0)
})
