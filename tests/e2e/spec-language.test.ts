import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import {
  anotherTab,
  editorOf,
  overwriteSpec,
  type Person,
  picture,
  replaceInSpec,
  saveSpec,
  signIn,
  typedText,
} from './person.ts'
import { serve, type Served } from './serve.ts'

/** The spec as a language: what the editor offers at the cursor, by the keyboard alone. */
let served: Served
let browser: Browser
let person: Person

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  person = await signIn(browser, served.address, 'consultant@demo.example')
  await person.page.goto('/p/FC-241/spec')
  await editorOf(person.page).waitFor()
  await person.page.getByText('Sized', { exact: false }).first().waitFor()
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

/** Puts the cursor into the first place where a text stands, with the search of the editor. */
const goTo = async (page: Page, text: string): Promise<void> => {
  await editorOf(page).click()
  await page.keyboard.press('ControlOrMeta+Home')
  await page.keyboard.press('ControlOrMeta+f')
  const search = page.locator('.cm-search input[name=search]')
  await search.fill('')
  await search.pressSequentially(text)
  await search.press('Enter')
  await page.keyboard.press('Escape')
  await expect.poll(() => page.evaluate(() => window.getSelection()?.toString())).toBe(text)
}

describe('Ctrl+.', () => {
  it('shows what a change would do, and makes it in one step to undo', async () => {
    const { page } = person
    await goTo(page, '50 psi')
    await page.keyboard.press('ControlOrMeta+.')
    const list = page.getByRole('listbox')
    await list.getByRole('option', { name: 'Write 345 kPa' }).waitFor()
    await page.keyboard.press('ArrowDown')
    await page.locator('.cm-panels').getByText('relief-valve: 345 kPa').waitFor()
    await picture(page, '50-change-offered')
    await page.keyboard.press('Enter')
    expect(await typedText(page)).toContain('relief-valve: 345 kPa')
    await page.keyboard.press('ControlOrMeta+z')
    expect(await typedText(page)).toContain('relief-valve: 50 psi')
  })

  it('puts a missing key in to be filled in, and the next keys fill it', async () => {
    const { page } = person
    const before = await typedText(page)
    await overwriteSpec(page, before.replace(/\n +relief-valve: 50 psi[^\n]*/u, ''))
    await page.getByRole('button', { name: /needs .*relief-valve/u }).waitFor()
    await page.getByRole('button', { name: 'Put in `relief-valve: …`' }).first().click()
    await page.getByText('is still to be filled in').first().waitFor()
    await page.keyboard.insertText('50 psi')
    expect(await typedText(page)).toContain('relief-valve: 50 psi')
    await overwriteSpec(page, before)
  })
})

describe('names', () => {
  it('F12 goes from the system to the fluid that fills it', async () => {
    const { page } = person
    await goTo(page, 'fluid: preheat-glycol')
    await page.keyboard.press('F12')
    await expect.poll(() => page.evaluate(() => window.getSelection()?.toString())).toBe('preheat-glycol')
    await expect(page.locator('.cm-activeLine').innerText()).resolves.toContain('base: propylene glycol')
  })

  it('Shift+F12 lists the uses', async () => {
    const { page } = person
    await page.keyboard.press('Shift+F12')
    const panel = page.getByRole('region', { name: 'preheat-glycol: 2 places' })
    await panel.getByRole('button', { name: /used/u }).waitFor()
    await page.keyboard.press('Escape')
    await panel.waitFor({ state: 'detached' })
  })

  it('F2 renames everywhere in one step, and refuses what is taken', async () => {
    const { page } = person
    await goTo(page, 'ET-1')
    await page.keyboard.press('F2')
    const name = page.getByLabel('New name')
    await name.fill('ET-2')
    await page.getByText('is taken').waitFor()
    await name.fill('ET-9')
    await page.getByText('places will change').waitFor()
    await picture(page, '51-rename')
    await page.keyboard.press('Enter')
    const renamed = await typedText(page)
    expect(renamed).toContain('  ET-9:')
    expect(renamed).not.toMatch(/(?<!T)ET-1\b/u)
    await page.keyboard.press('ControlOrMeta+z')
    expect(await typedText(page)).toContain('  ET-1:')
  })
})

it('Format says that nothing is to be done, and does what is', async () => {
  const { page } = person
  await page.getByRole('button', { name: 'Format' }).click()
  await page.getByText('no change needed').waitFor()
  const before = await typedText(page)
  await overwriteSpec(page, before.replace('units: US', 'units:    US'))
  await page.getByRole('button', { name: 'Format' }).click()
  await page.getByText('1 line tidied').waitFor()
  expect(await typedText(page)).toBe(before)
})

it('a conflict is merged by path: changes elsewhere are taken, the same place is asked about', async () => {
  const { page } = person
  const second = await anotherTab(person)
  await second.page.goto('/p/FC-241/spec')
  await editorOf(second.page).waitFor()
  await page.bringToFront()
  await replaceInSpec(page, 'static-height: 42 ft', 'static-height: 43 ft')
  await replaceInSpec(page, 'pump-head: 45 ft', 'pump-head: 46 ft')
  await saveSpec(page)
  await second.page.bringToFront()
  await replaceInSpec(second.page, 'static-height: 42 ft', 'static-height: 44 ft')
  const save = second.page.getByRole('button', { name: 'Save', exact: true })
  if ((await save.getAttribute('aria-disabled')) === null) await save.click()
  await second.page.getByRole('button', { name: 'Merge both' }).click()
  await second.page.getByText(/Merged with version \d+: 1 change of theirs is in the text/u).waitFor()
  await picture(second.page, '52-merged')
  // The editor takes a text from outside a moment after the last key.
  const merged = () => typedText(second.page)
  await expect.poll(merged).toContain('pump-head: 46 ft')
  expect(await merged()).toContain('static-height: 44 ft')
  await second.page.getByRole('button', { name: 'Take theirs' }).click()
  await second.page.getByText('2 changes of theirs are in the text').waitFor()
  await expect.poll(merged).toContain('static-height: 43 ft')
  expect([...person.complaints, ...second.complaints]).toEqual([])
})

it('Help explains every key, and shows a mistake of each code', async () => {
  const { page } = person
  await page.goto('/help#key-systems-vessels-buffer-tank')
  const heading = page.getByRole('heading', { name: 'Buffer tank' })
  await heading.waitFor()
  await expect.poll(() => page.evaluate(() => document.activeElement?.id)).toBe('key-systems-vessels-buffer-tank')
  await page.getByText('construction: blader').first().waitFor()
})
