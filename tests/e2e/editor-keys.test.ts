import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { editorOf, type Person, picture, replaceInSpec, signIn, typedText } from './person.ts'
import { serve, type Served } from './serve.ts'

/** The editor by keyboard and by touch: ways through the text, in and out of it, and what becomes of it without a network. */
let served: Served
let browser: Browser
let person: Person

const opened = async (page: Page, address = '/p/FC-241/spec'): Promise<void> => {
  await page.goto(address)
  await editorOf(page).waitFor()
  await page.getByText('Sized', { exact: false }).first().waitFor()
}

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  person = await signIn(browser, served.address, 'consultant@demo.example')
  await opened(person.page)
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

const activeLine = (page: Page) => page.locator('.cm-activeLine').innerText()
const selected = (page: Page) => page.evaluate(() => window.getSelection()?.toString())

it('Escape and then Tab leave the editor, Tab alone does not', async () => {
  const { page } = person
  await editorOf(page).click()
  const label = () => page.evaluate(() => document.activeElement?.getAttribute('aria-label') ?? '')
  await page.keyboard.press('Tab')
  expect(await label()).toMatch(/^Spec text/u)
  await page.keyboard.press('ControlOrMeta+z')
  await page.keyboard.press('Escape')
  await page.keyboard.press('Tab')
  expect(await label()).not.toMatch(/^Spec text/u)
})

it('F8 goes from finding to finding, and Shift+F8 back', async () => {
  const { page } = person
  await editorOf(page).click()
  await page.keyboard.press('ControlOrMeta+Home')
  await page.keyboard.press('F8')
  await expect.poll(() => selected(page)).not.toBe('')
  const first = await activeLine(page)
  await page.keyboard.press('F8')
  await expect.poll(() => activeLine(page)).not.toBe(first)
  await page.keyboard.press('Shift+F8')
  await expect.poll(() => activeLine(page)).toBe(first)
})

it('a trace step leads to the line of the spec, and the result beside the line back to the trace, in the same units', async () => {
  const { page } = person
  await page.goto('/p/FC-241/trace/ET-1?units=si')
  await page.getByRole('link', { name: 'spec: 180 °F' }).first().click()
  await editorOf(page).waitFor()
  await expect.poll(() => activeLine(page)).toContain('high: 180 °F')
  expect(new URL(page.url()).searchParams.get('units')).toBe('si')
  await page.getByRole('tab', { name: /^Results/u }).click()
  await page.getByRole('link', { name: 'Trace of ET-1, as saved' }).click()
  await page.getByRole('heading', { name: 'Trace ET-1' }).waitFor()
  expect(new URL(page.url()).searchParams.get('units')).toBe('si')
})

it('the spec of a revision is read only, and its links stay with the revision', async () => {
  const { page } = person
  const issued = await page.request.post('/api/projects/FC-241/revisions', {
    data: { purpose: 'review', note: '' },
    headers: { 'X-Requested-With': 'coldfill' },
  })
  expect(issued.status()).toBe(201)
  await opened(page, '/p/FC-241/spec?rev=-')
  await page.getByText('is frozen as it was issued').first().waitFor()
  await page.getByRole('tab', { name: /^Results/u }).click()
  await page.getByRole('link', { name: 'Trace of ET-1, as saved' }).click()
  await page.getByRole('heading', { name: 'Trace ET-1' }).waitFor()
  expect(new URL(page.url()).searchParams.get('rev')).toBe('-')
})

it('on a phone the outline comes by a button, says sizes and findings, and leads to the line', async () => {
  const { page } = person
  await page.setViewportSize({ width: 390, height: 844 })
  await opened(page)
  const outline = page.getByRole('navigation', { name: 'Outline' })
  expect(await outline.isVisible()).toBe(false)
  await page.getByRole('button', { name: 'Outline' }).press('Enter')
  await outline.getByRole('button', { name: /^ET-1.*gal/u }).waitFor()
  await picture(page, '57-outline-on-a-phone')
  await page.keyboard.press('Escape')
  await outline.waitFor({ state: 'hidden' })
  await page.getByRole('button', { name: 'Outline' }).click()
  await outline.getByRole('button', { name: /^ET-2/u }).click()
  await outline.waitFor({ state: 'hidden' })
  await expect.poll(() => activeLine(page)).toContain('ET-2:')
  await page.setViewportSize({ width: 1440, height: 900 })
})

it('without a network the results are dated, a save fails in words, and the text is offered after a reload', async () => {
  const { page } = person
  await opened(page)
  const cut = '**/api/projects/FC-241/{spec,sizing}'
  await page.route(cut, (route) => (route.request().method() === 'GET' ? route.continue() : route.abort('failed')))
  await replaceInSpec(page, 'static-height: 42 ft', 'static-height: 47 ft')
  await page.getByText(/Results of \d\d:\d\d/u).waitFor()
  await page.keyboard.press('ControlOrMeta+s')
  await page.getByText('Not saved; kept on this device').waitFor()
  expect(await typedText(page)).toContain('static-height: 47 ft')
  await page.unroute(cut)
  await page.reload()
  await editorOf(page).waitFor()
  await page.getByRole('button', { name: 'Take it up' }).first().click()
  await expect.poll(() => typedText(page)).toContain('static-height: 47 ft')
})

it('no sheet complained in the console of a browser', () => {
  expect(person.complaints).toEqual([])
})
