import { join } from 'node:path'
import type { Browser, Page } from 'playwright-core'
import { expect } from 'vitest'

const PASSWORD = 'coldfill-demo'

/** A person at a desk: a browser of their own, signed in. */
export interface Person {
  readonly page: Page
  /** What the console of the browser complained about. */
  readonly complaints: string[]
}

const watch = (page: Page, complaints: string[]): void => {
  page.on('pageerror', (error) => complaints.push(error.message))
  page.on('console', (message) => {
    // The browser itself logs each answer above 399; the sheets say in words what it means.
    if (message.type() === 'error' && !message.text().startsWith('Failed to load resource'))
      complaints.push(message.text())
  })
}

export const signIn = async (browser: Browser, address: string, email: string): Promise<Person> => {
  const context = await browser.newContext({
    baseURL: address,
    viewport: { width: 1440, height: 900 },
    acceptDownloads: true,
    locale: 'en-US',
    permissions: ['clipboard-read', 'clipboard-write'],
  })
  context.setDefaultTimeout(30_000)
  const page = await context.newPage()
  const complaints: string[] = []
  watch(page, complaints)
  await page.goto('/in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill(PASSWORD)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL('/')
  await page.getByRole('heading', { level: 1 }).waitFor()
  return { page, complaints }
}

/** Another tab of the same person. */
export const anotherTab = async ({ page, complaints }: Person): Promise<Person> => {
  const tab = await page.context().newPage()
  watch(tab, complaints)
  return { page: tab, complaints }
}

/** Follows a link of the sheet list. */
export const toSheet = async (page: Page, name: string): Promise<void> => {
  await page
    .getByRole('navigation', { name: 'Sheets' })
    .getByRole('link', { name: new RegExp(name, 'u') })
    .click()
  await page.getByRole('heading', { name, level: 1 }).waitFor()
}

export const editorOf = (page: Page) => page.getByRole('textbox', { name: /^Spec text/u })

/** Finds a text in the editor with its search, and types another over it. */
export const replaceInSpec = async (page: Page, was: string, now: string): Promise<void> => {
  await editorOf(page).click()
  await page.keyboard.press('ControlOrMeta+Home')
  await page.keyboard.press('ControlOrMeta+f')
  const search = page.locator('.cm-search input[name=search]')
  await search.pressSequentially(was)
  await search.press('Enter')
  await page.keyboard.press('Escape')
  await expect.poll(() => page.evaluate(() => window.getSelection()?.toString())).toBe(was)
  await page.keyboard.insertText(now)
}

/** Pastes a whole text in place of what is in the editor. */
export const overwriteSpec = async (page: Page, text: string): Promise<void> => {
  await page.evaluate((pasted) => navigator.clipboard.writeText(pasted), text)
  await editorOf(page).click()
  await page.keyboard.press('ControlOrMeta+a')
  await page.keyboard.press('ControlOrMeta+v')
}

/** The whole text of the editor, which draws only the lines in sight. */
export const typedText = async (page: Page): Promise<string> => {
  await editorOf(page).click()
  await page.keyboard.press('ControlOrMeta+a')
  await page.keyboard.press('ControlOrMeta+c')
  const text = await page.evaluate(() => navigator.clipboard.readText())
  await page.keyboard.press('ControlOrMeta+Home')
  return text
}

export const saveSpec = async (page: Page): Promise<void> => {
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await page.getByText(/^Saved .*, version \d+$/u).waitFor()
}

/** The line of a vessel in the list of results under the editor. */
export const resultLine = (page: Page, mark: string) =>
  page
    .getByRole('tabpanel', { name: /^Results/u })
    .getByRole('listitem')
    .filter({ hasText: new RegExp(`^${mark}`, 'u') })

/** Writes a picture where COLDFILL_SCREENSHOTS names a folder. */
export const picture = async (page: Page, name: string): Promise<void> => {
  const folder = process.env['COLDFILL_SCREENSHOTS']
  if (folder !== undefined && folder !== '') await page.screenshot({ path: join(folder, `${name}.png`) })
}
