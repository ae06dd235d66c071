import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { anotherTab, editorOf, type Person, picture, replaceInSpec, saveSpec, signIn, typedText } from './person.ts'
import { serve, type Served } from './serve.ts'

/** Two texts beside each other: a conflict with its merge by path, line by line, after a reload, and against an issue. */
let served: Served
let browser: Browser
let first: Person
let second: Person

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  first = await signIn(browser, served.address, 'consultant@demo.example')
  second = await anotherTab(first)
  for (const { page } of [first, second]) {
    await page.goto('/p/FC-241/spec')
    await editorOf(page).waitFor()
  }
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

const compareOf = (page: Page) => page.getByRole('region', { name: 'Compare' })
const yours = (page: Page) => page.getByRole('textbox', { name: /^Your text/u })
const bandOf = (page: Page, title: string | RegExp) => page.getByText(title).locator('../..')

const closed = async (page: Page): Promise<string> => {
  await compareOf(page).getByRole('button', { name: 'Close', exact: true }).click()
  await compareOf(page).waitFor({ state: 'detached' })
  return typedText(page)
}

it('a save that is refused sets both texts beside each other, with the results that differ', async () => {
  await first.page.bringToFront()
  await replaceInSpec(first.page, 'static-height: 42 ft', 'static-height: 43 ft')
  await replaceInSpec(first.page, 'pump-head: 45 ft', 'pump-head: 46 ft')
  await saveSpec(first.page)
  const { page } = second
  await page.bringToFront()
  await replaceInSpec(page, 'static-height: 42 ft', 'static-height: 44 ft')
  await page.keyboard.press('ControlOrMeta+s')
  await page.getByText(/saved version 2 at .*, while you were at version 1/u).waitFor()
  await compareOf(page).getByText('Saved version 2').first().waitFor()
  // Height moves the fill pressure, and the vessel moves with it.
  await compareOf(page)
    .getByRole('row', { name: /ET-1.*Required volume/u })
    .waitFor()
  await picture(page, '54-conflict-compared')
})

it('a conflict is merged by path: changes elsewhere are taken, the same place is asked about', async () => {
  const { page } = second
  await page.getByRole('button', { name: 'Merge both' }).click()
  await page.getByText(/Merged with version 2: 1 change of theirs is in the text/u).waitFor()
  const conflict = compareOf(page).getByRole('listitem').filter({ hasText: 'systems.HWS.pressure.static-height' })
  await conflict.getByText('44 ft').waitFor()
  await conflict.getByText('43 ft').waitFor()
  await picture(page, '52-merged')
  const mine = await closed(page)
  expect(mine).toContain('pump-head: 46 ft')
  expect(mine).toContain('static-height: 44 ft')
})

it('a reload loses neither text nor the places to choose', async () => {
  const { page } = second
  await page.reload()
  await editorOf(page).waitFor()
  await page.getByText('Your text from before the merge is kept on this device').waitFor()
  await bandOf(page, 'A merge that was not saved is kept on this device')
    .getByRole('button', { name: 'Take it up' })
    .click()
  await page.getByText(/^Merged with version 2\./u).waitFor()
  await page.getByRole('button', { name: 'Compare both' }).click()
  const conflict = compareOf(page).getByRole('listitem').filter({ hasText: 'systems.HWS.pressure.static-height' })
  await conflict.getByRole('button', { name: /static-height/u }).click()
  await expect
    .poll(() => page.evaluate(() => document.activeElement?.getAttribute('aria-label')))
    .toMatch(/^Your text/u)
  await conflict.getByRole('button', { name: 'Take theirs' }).click()
  await compareOf(page).getByText('The texts are the same.').waitFor()
  expect(await closed(page)).toContain('static-height: 43 ft')
})

it('the text from before the merge can be had back, and comes with the conflict', async () => {
  const { page } = second
  await page.getByRole('button', { name: 'Done' }).click()
  await bandOf(page, 'Your text from before the merge is kept on this device')
    .getByRole('button', { name: 'Take it up' })
    .click()
  await page.getByText(/saved version 2 at .*, while you were at version 1/u).waitFor()
  const text = await typedText(page)
  expect(text).toContain('static-height: 44 ft')
  expect(text).toContain('pump-head: 45 ft')
})

it('lines of the other are taken one place at a time, by the keyboard, and undone', async () => {
  const { page } = second
  await page.getByRole('button', { name: 'Compare both' }).click()
  await compareOf(page)
    .getByText(/^Place 1 of/u)
    .waitFor()
  await page.keyboard.press('Alt+n')
  await compareOf(page).getByRole('button', { name: 'Take the other here' }).focus()
  for (const places = page.getByText('The texts are the same.'); !(await places.isVisible());) {
    await page.keyboard.press('Alt+n')
    await compareOf(page).getByRole('button', { name: 'Take the other here' }).press('Enter')
    await page.waitForTimeout(200)
  }
  await yours(page).focus()
  await page.keyboard.press('ControlOrMeta+z')
  await page.getByText('The texts are the same.').waitFor({ state: 'detached' })
  await page.keyboard.press('ControlOrMeta+z')
  expect(await closed(page)).toContain('static-height: 44 ft')
})

it('what was chosen is saved, and what was kept for the choice goes', async () => {
  const { page } = second
  await page.getByRole('button', { name: 'Merge both' }).click()
  await page.getByRole('button', { name: 'Take theirs' }).click()
  await page.getByText('Nothing is left that both changed.').waitFor()
  // The right text is an editor like the other.
  await yours(page).click()
  await page.keyboard.press('ControlOrMeta+Home')
  await page.keyboard.insertText('# settled\n')
  await page.getByText('Not saved; kept on this device').waitFor()
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await page.getByText(/^Saved .*, version 3$/u).waitFor()
  await page.getByText('from before the merge').waitFor({ state: 'detached' })
  expect(await typedText(page)).toContain('# settled')
})

it('a phone shows one text with the lines of the other between', async () => {
  const { page } = second
  await replaceInSpec(page, 'pump-head: 46 ft', 'pump-head: 47 ft')
  await page.setViewportSize({ width: 390, height: 844 })
  await page.getByRole('button', { name: 'Compare', exact: true }).click()
  await compareOf(page).locator('.cm-deletedChunk').getByText('46').waitFor()
  await picture(page, '55-compared-on-a-phone')
  await compareOf(page).getByRole('button', { name: 'Take these' }).click()
  await compareOf(page).getByText('The texts are the same.').waitFor()
  await page.setViewportSize({ width: 1440, height: 900 })
  expect(await closed(page)).toContain('pump-head: 46 ft')
})

it('two contents stand beside each other, with the results that moved', async () => {
  const { page } = first
  const issued = await page.request.post('/api/projects/FC-241/revisions', {
    data: { purpose: 'review', note: '' },
    headers: { 'X-Requested-With': 'coldfill' },
  })
  expect(issued.status()).toBe(201)
  await page.bringToFront()
  await page.reload()
  await editorOf(page).waitFor()
  await replaceInSpec(page, 'static-height: 43 ft', 'static-height: 60 ft')
  await saveSpec(page)
  await page.getByRole('button', { name: 'Compare', exact: true }).click()
  await page.getByLabel('Beside').selectOption({ label: 'First issue' })
  await compareOf(page)
    .getByRole('row', { name: /ET-1.*Required volume/u })
    .waitFor()
  await page.getByRole('link', { name: 'Any two revisions' }).click()
  await page.getByRole('heading', { name: 'Compare', level: 1 }).waitFor()
  await page.getByRole('row', { name: /ET-1.*Required volume/u }).waitFor()
  await page.getByText('Place 1 of 1').waitFor()
  await picture(page, '56-two-contents')
  await page.getByRole('link', { name: 'ET-1' }).first().click()
  await page.getByRole('heading', { name: 'Trace ET-1' }).waitFor()
})

it('no sheet complained in the console of a browser', () => {
  expect([...first.complaints, ...second.complaints]).toEqual([])
})
