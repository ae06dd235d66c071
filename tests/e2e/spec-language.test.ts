import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { editorOf, overwriteSpec, type Person, picture, signIn, typedText } from './person.ts'
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
    await page.getByRole('button', { name: 'Put in relief-valve: …' }).first().click()
    const change = page.getByRole('group', { name: /What would change/u })
    await change.getByText('relief-valve: …').waitFor()
    await picture(page, '53-fix-in-the-list')
    // Escape leaves it undone; the keyboard alone makes it.
    await page.keyboard.press('Escape')
    await change.waitFor({ state: 'detached' })
    expect(await typedText(page)).not.toContain('relief-valve: …')
    await page.getByRole('button', { name: 'Put in relief-valve: …' }).first().press('Enter')
    await change.getByRole('button', { name: 'Make the change' }).waitFor()
    await page.keyboard.press('Enter')
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

it('Help explains every key, and shows a mistake of each code', async () => {
  const { page } = person
  await page.goto('/help#key-systems-vessels-buffer-tank')
  const heading = page.getByRole('heading', { name: 'Buffer tank' })
  await heading.waitFor()
  await expect.poll(() => page.evaluate(() => document.activeElement?.id)).toBe('key-systems-vessels-buffer-tank')
  await page.getByText('construction: blader').first().waitFor()
})
