import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { anotherTab, editorOf, type Person, picture, replaceInSpec, saveSpec, signIn, typedText } from './person.ts'
import { serve, type Served } from './serve.ts'

/** Two tabs of one person on one spec: neither overwrites the other, and nothing typed is lost. */
let served: Served
let browser: Browser
let first: Person
let second: Person

interface SpecAnswer {
  readonly text: string
  readonly version: number
}
const onServer = async (): Promise<SpecAnswer> =>
  (await (await first.page.request.get('/api/projects/FC-241/spec')).json()) as SpecAnswer

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  first = await signIn(browser, served.address, 'consultant@demo.example')
  second = await anotherTab(first)
  await first.page.goto('/p/FC-241/spec')
  await second.page.goto('/p/FC-241/spec')
  await editorOf(first.page).waitFor()
  await editorOf(second.page).waitFor()
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

it('the second save is refused where the first tab saved meanwhile, and its text stays in the editor', async () => {
  await replaceInSpec(first.page, 'relief-valve: 50 psi', 'relief-valve: 60 psi')
  await replaceInSpec(second.page, 'static-height: 42 ft', 'static-height: 43 ft')
  await saveSpec(first.page)
  await second.page.bringToFront()
  const save = second.page.getByRole('button', { name: 'Save', exact: true })
  if ((await save.getAttribute('aria-disabled')) === null) await save.click()
  await second.page.getByText(/saved version 2 at .*, while you were at version 1/u).waitFor()
  await picture(second.page, '30-conflict')
  const { text, version } = await onServer()
  expect(version).toBe(2)
  expect(text).toContain('relief-valve: 60 psi')
  expect(text).not.toContain('static-height: 43 ft')
  // A save that was refused sets both texts beside each other.
  const close = second.page.getByRole('region', { name: 'Compare' }).getByRole('button', { name: 'Close', exact: true })
  if (await close.isVisible()) await close.click()
  expect(await typedText(second.page)).toContain('static-height: 43 ft')
})

it('taking the other text keeps the own one on the device, and gives it back', async () => {
  const { page } = second
  await page.getByRole('button', { name: 'Take version 2' }).click()
  await page.getByText('A text that was not saved is kept on this device').waitFor()
  expect(await typedText(second.page)).toContain('relief-valve: 60 psi')
  await page.getByRole('button', { name: 'Take it up' }).click()
  // It was begun on version 1, so that version 2 is not forgotten.
  await page.getByText(/saved version 2 at .*, while you were at version 1/u).waitFor()
  const mine = await typedText(second.page)
  expect(mine).toContain('static-height: 43 ft')
  expect(mine).toContain('relief-valve: 50 psi')
})

it('a text that was never saved outlives a reload', async () => {
  await second.page.reload()
  await editorOf(second.page).waitFor()
  await second.page.getByText('A text that was not saved is kept on this device').first().waitFor()
  expect((await onServer()).text).toContain('relief-valve: 60 psi')
  await second.page.getByRole('button', { name: 'Take it up' }).first().click()
  expect(await typedText(second.page)).toContain('static-height: 43 ft')
})

it('saving over the other text is asked for, and then takes effect', async () => {
  const { page } = second
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  const compare = page.getByRole('region', { name: 'Compare' })
  await compare.getByText('Saved version 2').first().waitFor()
  await page.getByRole('button', { name: 'Save mine over it' }).click()
  await page.getByText(/^Saved .*, version 3$/u).waitFor()
  await compare.waitFor({ state: 'detached' })
  // The server has the newest text alone, so that the one saved over is kept here.
  await page.getByText('Version 2, which you saved over, is kept on this device.').waitFor()
  const { text, version } = await onServer()
  expect(version).toBe(3)
  expect(text).toContain('static-height: 43 ft')
  // The tab that typed nothing follows by itself or on its next look.
  await first.page.bringToFront()
  await first.page.reload()
  await editorOf(first.page).waitFor()
  expect(await typedText(first.page)).toContain('static-height: 43 ft')
})

it('no sheet complained in the console of a browser', () => {
  expect(first.complaints).toEqual([])
})
