import { createHash } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import ExcelJS from 'exceljs'
import { strFromU8, unzipSync } from 'fflate'
import type { Browser, Locator, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { et1, et1With, et2, tet1 } from '../golden/fernhollow.by-hand.ts'
import { launchBrowser } from './browser.ts'
import { editorOf, type Person, picture, replaceInSpec, resultLine, saveSpec, signIn, toSheet } from './person.ts'
import { serve, type Served } from './serve.ts'

/** One project from the first change to the contractor's download, each person in a browser of their own. The steps follow each other. */
let served: Served
let browser: Browser
let consultant: Person
let reviewer: Person
let contractor: Person

// By hand, see golden/fernhollow.by-hand.ts: the relief valve raised to 60 psi, then the height mended to 44 ft.
const raised = et1With({ relief: 60, height: 42 })
const mended = et1With({ relief: 60, height: 44 })
const gal = (value: number): string => `${value.toFixed(1)} gal`
const psig = (value: number): string => `${value.toFixed(1)} psig`

const scheduleCell = (page: Page, mark: string, column: string) =>
  page.evaluate(
    ([wantedMark, heading]) => {
      for (const table of document.querySelectorAll('table[role=grid]')) {
        const at = [...table.querySelectorAll('thead th')].findIndex((head) =>
          head.textContent?.startsWith(heading ?? ''),
        )
        for (const row of table.querySelectorAll('tbody tr'))
          if (row.querySelector('th')?.textContent?.startsWith(wantedMark ?? ''))
            return row.children[at]?.textContent ?? null
      }
      return null
    },
    [mark, column],
  )

/** Whether a text has a number that a value could be shown as, to a tenth. */
const shows = (text: string | null, value: number): boolean =>
  (text?.match(/\d+(?:\.\d+)?/gu) ?? []).some((number) => Math.abs(Number(number) - value) <= 0.051)

const clickCell = async (page: Page, mark: string, column: string): Promise<void> => {
  const table = page.getByRole('grid').filter({ hasText: mark }).first()
  const headings = await table.locator('thead th').allTextContents()
  const at = headings.findIndex((heading) => heading.startsWith(column))
  expect(headings.join('|')).toContain(column)
  const row = table
    .locator('tbody tr')
    .filter({ has: page.locator('th', { hasText: mark }) })
    .first()
  await row.locator('th, td').nth(at).click()
}

/** Endings of the files that can be downloaded, once there are so many. Making them takes some seconds. */
const downloads = async (place: Locator, count: number): Promise<string[]> => {
  const links = place.getByRole('link', { name: /^Download/u })
  await expect.poll(() => links.count(), { timeout: 90_000 }).toBe(count)
  const names = await links.evaluateAll((found) => found.map((link) => link.getAttribute('download') ?? ''))
  return names.map((name) => name.split('.').at(-1) ?? '').sort()
}

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

it('the consultant signs in, opens the demo project and sees it sized', async () => {
  consultant = await signIn(browser, served.address, 'consultant@demo.example')
  const { page } = consultant
  await picture(page, '01-projects')
  await page.getByRole('link', { name: 'Fernhollow Community Clinic' }).click()
  await page.getByRole('heading', { level: 1 }).waitFor()
  await picture(page, '02-cover')
  await toSheet(page, 'Spec')
  await page.getByRole('tab', { name: /^Results/u }).click()
  await resultLine(page, 'ET-1').waitFor()
  await expect.poll(() => resultLine(page, 'ET-1').textContent()).toContain(gal(et1.required))
  await picture(page, '03-spec')
})

it('changes a relief setting in the YAML and sees the size change', async () => {
  const { page } = consultant
  await replaceInSpec(page, 'relief-valve: 50 psi', 'relief-valve: 60 psi')
  await resultLine(page, 'ET-1').getByText(gal(raised.required)).waitFor()
  expect(raised.required).toBeLessThan(et1.required)
  await picture(page, '04-spec-changed')
  await saveSpec(page)
  await toSheet(page, 'Schedule')
  await expect.poll(async () => shows(await scheduleCell(page, 'ET-1', 'Required'), raised.required)).toBe(true)
  await picture(page, '05-schedule')
})

it('issues for review, and the files are made', async () => {
  const { page } = consultant
  await toSheet(page, 'Issue')
  await page.getByLabel('Note').fill('First issue: relief valve of the heating water raised to 60 psi.')
  await page.getByRole('button', { name: 'Issue for review' }).click()
  expect(await downloads(page.getByRole('article', { name: 'First issue' }), 2)).toEqual(['docx', 'xlsx'])
  await picture(page, '06-issued')
})

it('the contractor has nothing yet', async () => {
  contractor = await signIn(browser, served.address, 'contractor@demo.example')
  const { page } = contractor
  await page.getByRole('link', { name: 'Fernhollow Community Clinic' }).click()
  await page.waitForURL('**/d/FC-241')
  await page.getByText('Nothing may be built from this page').waitFor()
  expect(await page.getByRole('link', { name: /^Download/u }).count()).toBe(0)
  await picture(page, '07-handover-empty')
})

it('the reviewer redlines the precharge and sets Revise and resubmit with a reason', async () => {
  reviewer = await signIn(browser, served.address, 'reviewer@demo.example')
  const { page } = reviewer
  await page.getByRole('link', { name: 'Fernhollow Community Clinic' }).click()
  await toSheet(page, 'Schedule')
  await page.getByRole('grid').first().waitFor()
  await clickCell(page, 'ET-1', 'Precharge')
  await picture(page, '08-trace')
  await page.getByRole('button', { name: 'Start a redline' }).click()
  const form = page.getByRole('form', { name: 'New redline' })
  await form.getByLabel('Redline').fill('The coil on the roof stands 2 ft above the highest pipe counted here.')
  await form.getByLabel('Proposed value').fill(psig(mended.fill))
  await form.getByLabel('Must be answered before issue for construction').check()
  await form.getByRole('button', { name: 'Add to pending' }).click()
  await page.getByText('1 redline pending.').waitFor()
  await picture(page, '09-pending')
  await toSheet(page, 'Redlines')
  const review = page.getByRole('form', { name: 'Send review' })
  await review.getByRole('radio', { name: /^Revise and resubmit/u }).check()
  // Without a reason it is not sent.
  await review.getByRole('button', { name: 'Send review' }).click({ force: true })
  await review.getByText('Give the reason').waitFor()
  await review.getByLabel('Reason').fill('Static height to be checked against the roof coil.')
  await review.getByRole('button', { name: 'Send review' }).click()
  const disposition = page.getByRole('listitem').filter({ hasText: 'Static height to be checked' })
  await disposition.waitFor()
  expect(await disposition.textContent()).toContain('Revise and resubmit')
  await picture(page, '10-review-sent')
})

it('the consultant cannot issue for construction over it', async () => {
  const { page } = consultant
  await page.goto('/p/FC-241/issue')
  await page.getByRole('list', { name: 'Gate list' }).first().waitFor()
  expect(await page.getByRole('button', { name: 'Issue for construction' }).getAttribute('aria-disabled')).toBe('true')
  await picture(page, '11-gates-hold')
})

it('the consultant answers, mends the spec and issues again', async () => {
  const { page } = consultant
  await toSheet(page, 'Redlines')
  await page.getByRole('article', { name: 'Redline 1' }).waitFor()
  await page.getByText('The coil on the roof stands 2 ft above').first().waitFor()
  await page.getByLabel('Reply to redline 1').fill('Height raised to 44 ft; the precharge follows.')
  await page.getByRole('button', { name: 'Reply' }).click()
  await page.getByRole('article', { name: 'Redline 1' }).getByText('Height raised to 44 ft').waitFor()
  await picture(page, '12-redline-answered')

  await toSheet(page, 'Spec')
  await editorOf(page).waitFor()
  await page.getByRole('tab', { name: /^Results/u }).click()
  await replaceInSpec(page, 'static-height: 42 ft', 'static-height: 44 ft')
  await resultLine(page, 'ET-1').getByText(gal(mended.required)).waitFor()
  await saveSpec(page)

  await toSheet(page, 'Issue')
  await page.getByLabel('Note').fill('Height of the roof coil.')
  await page.getByRole('button', { name: 'Issue for review' }).click()
  const article = page.getByRole('article', { name: 'Rev A' })
  expect(await downloads(article, 2)).toEqual(['docx', 'xlsx'])
  await picture(page, '13-rev-a')
})

it('the reviewer sees what moved, closes the redline and accepts', async () => {
  const { page } = reviewer
  await page.goto('/p/FC-241/schedule')
  await expect.poll(async () => shows(await scheduleCell(page, 'ET-1', 'Precharge'), mended.fill)).toBe(true)
  // What was is struck beside what is.
  expect(shows(await scheduleCell(page, 'ET-1', 'Precharge'), raised.fill)).toBe(true)
  await picture(page, '14-schedule-rev-a')
  await toSheet(page, 'Basis')
  await page.getByRole('heading', { name: 'Basis', level: 1 }).waitFor()
  await picture(page, '15-basis')
  await toSheet(page, 'Redlines')
  const thread = page.getByRole('article', { name: 'Redline 1' })
  await thread.getByText('Moved').waitFor()
  await picture(page, '16-redline-moved')
  await thread.getByRole('button', { name: 'Close' }).click()
  await page.getByText('Open 0').waitFor()
  // It stays with the revision that it was written on.
  await page.goto('/p/FC-241/redlines?rev=-&filter=closed')
  await page.getByText('closed it').waitFor()
  await page.goto('/p/FC-241/redlines')
  const review = page.getByRole('form', { name: 'Send review' })
  await review.getByRole('radio', { name: /^Accepted(?! as noted)/u }).check()
  await review.getByRole('button', { name: 'Send review' }).click()
  await page
    .getByRole('listitem')
    .filter({ hasText: /^Accepted/u })
    .waitFor()
  await picture(page, '17-accepted')
})

it('the consultant issues for construction', async () => {
  const { page } = consultant
  await page.goto('/p/FC-241/issue')
  const button = page.getByRole('button', { name: 'Issue for construction' })
  await expect.poll(() => button.getAttribute('aria-disabled')).toBeNull()
  await button.click()
  await page.getByText('Files for construction').waitFor({ timeout: 90_000 })
  expect(await downloads(page.getByRole('article', { name: 'Rev A' }), 4)).toEqual(['docx', 'docx', 'xlsx', 'xlsx'])
  await picture(page, '18-issued-for-construction')
})

const download = async (page: Page, kind: RegExp): Promise<{ name: string; bytes: Buffer }> => {
  const waiting = page.waitForEvent('download')
  await page.getByRole('link', { name: kind }).click()
  const file = await waiting
  return { name: file.suggestedFilename(), bytes: await readFile(await file.path()) }
}

const shownHash = (page: Page, name: string) =>
  page
    .getByRole('listitem')
    .filter({ hasText: name })
    .getByText(/SHA-256 [0-9a-f]{64}/u)
    .textContent()

it('the contractor sees only that, and downloads both files with the sized numbers', async () => {
  const { page } = contractor
  await page.goto('/d/FC-241')
  await page.getByText('This is the current revision.').waitFor()
  const row = page.getByRole('row').filter({ hasText: 'ET-1' })
  await row.getByText(psig(mended.fill)).first().waitFor()
  await picture(page, '19-handover')

  const schedule = await download(page, /^Download .*\.xlsx$/u)
  const submittal = await download(page, /^Download .*\.docx$/u)
  for (const { name, bytes } of [schedule, submittal]) {
    expect(name).toContain('FC-241')
    expect(await shownHash(page, name)).toContain(createHash('sha256').update(bytes).digest('hex'))
  }

  // The workbook: a row of the schedule by its mark, cells by the words of the head.
  const book = new ExcelJS.Workbook()
  await book.xlsx.load(
    schedule.bytes.buffer.slice(
      schedule.bytes.byteOffset,
      schedule.bytes.byteOffset + schedule.bytes.length,
    ) as ArrayBuffer,
  )
  const numbersOf = (mark: string): number[] =>
    book.worksheets.flatMap((sheet) => {
      const found: number[] = []
      sheet.eachRow((cells) => {
        if (!cells.values || cells.getCell(1).text !== mark) return
        cells.eachCell((cell) => {
          const value =
            typeof cell.value === 'object' && cell.value !== null && 'result' in cell.value
              ? cell.value.result
              : cell.value
          if (typeof value === 'number') found.push(value)
        })
      })
      return found
    })
  const sized = [
    { mark: 'ET-1', hand: mended },
    { mark: 'ET-2', hand: et2 },
    { mark: 'TET-1', hand: tet1 },
  ]
  for (const { mark, hand } of sized)
    for (const value of [hand.required, hand.system, hand.fill, hand.maximum]) {
      const held = numbersOf(mark).some((number) => Math.abs(number / value - 1) < 1e-4)
      expect({ mark, value, held }).toEqual({ mark, value, held: true })
    }

  // The document: an Office package whose text has the same numbers as they are shown.
  const parts = unzipSync(new Uint8Array(submittal.bytes))
  const xml = strFromU8(parts['word/document.xml'] ?? new Uint8Array())
  const bare = (text: string): string => text.replace(/<\/w:(?:p|tc)>/gu, '\n').replace(/<[^>]+>/gu, '')
  const rows = [...xml.matchAll(/<w:tr[ >].*?<\/w:tr>/gsu)].map(([row]) => bare(row).trim())
  for (const { mark, hand } of sized) {
    const found = rows.filter((row) => row.split('\n')[0] === mark).join('\n')
    for (const value of [hand.required, hand.fill, hand.maximum])
      expect({ mark, value, shown: shows(found, value) }).toEqual({ mark, value, shown: true })
  }
  const words = bare(xml)
  expect(words).toContain('Issued for construction')
  expect(words).toContain('Fernhollow Community Clinic')
})

it('the contractor finds no other sheet, by link or by address', async () => {
  const { page } = contractor
  expect(await page.getByRole('navigation', { name: 'Sheets' }).count()).toBe(0)
  for (const path of [
    '/p/FC-241',
    '/p/FC-241/spec',
    '/p/FC-241/schedule',
    '/p/FC-241/issue',
    '/p/FC-241/redlines',
    '/office',
  ]) {
    await page.goto(path)
    await page.getByText('There is nothing at this address, or it is not yours to see.').waitFor()
  }
  for (const path of ['spec', 'results', 'redlines', 'gates?for=construction'])
    expect({ path, status: (await page.request.get(`/api/projects/FC-241/${path}`)).status() }).toEqual({
      path,
      status: 404,
    })
})

it("a stranger's project answers 404, as one that is not there", async () => {
  const { page } = await signIn(browser, served.address, 'stranger@other.example')
  await page.goto('/p/FC-241')
  await page.getByText('There is nothing at this address, or it is not yours to see.').waitFor()
  await picture(page, '20-stranger')
  const answers = await Promise.all(['FC-241', 'ZZ-999'].map((number) => page.request.get(`/api/projects/${number}`)))
  expect(answers.map((answer) => answer.status())).toEqual([404, 404])
  const [foreign, missing] = (await Promise.all(answers.map((answer) => answer.json()))) as Record<string, unknown>[]
  expect(Object.keys(foreign ?? {})).toEqual(Object.keys(missing ?? {}))
  expect(foreign?.['code']).toBe(missing?.['code'])
  const file = await contractor.page.request.get('/api/projects/FC-241/handover')
  const handover = (await file.json()) as { current: { files: { href: string }[] } }
  for (const { href } of handover.current.files) expect((await page.request.get(href)).status()).toBe(404)
})

it('the administrator finds the mails of the story in the outbox', async () => {
  const { page } = await signIn(browser, served.address, 'admin@demo.example')
  await page.goto('/office')
  await page.getByRole('heading', { level: 1 }).waitFor()
  const outbox = (await (await page.request.get('/api/office/outbox')).json()) as {
    mails: { subject: string; to: unknown }[]
  }
  const subjects = outbox.mails.map(({ subject }) => subject).join('\n')
  expect(subjects).toMatch(/review/iu)
  expect(subjects).toMatch(/construction/iu)
  expect(outbox.mails.length).toBeGreaterThanOrEqual(5)
  await picture(page, '21-office')
})

it('no sheet complained in the console of a browser', () => {
  expect([consultant, reviewer, contractor].flatMap(({ complaints }) => complaints)).toEqual([])
})

it('the server closes its database and ends well', async () => {
  expect(await served.stop()).toBe(0)
  expect(served.said()).toContain('Closed.')
})
