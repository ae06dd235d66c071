import { readFileSync } from 'node:fs'
import axe from 'axe-core'
import type { Browser, Page } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { editorOf, type Person, signIn } from './person.ts'
import { serve, type Served } from './serve.ts'

/** Every screen by the rules of WCAG 2.2 AA that a machine can judge, light and dark, on a desk and on a phone. */
let served: Served
let browser: Browser
let consultant: Person
let reviewer: Person
let administrator: Person

const engine = readFileSync(new URL(import.meta.resolve('axe-core/axe.min.js')), 'utf8')

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  ;[consultant, reviewer, administrator] = (await Promise.all(
    ['consultant', 'reviewer', 'admin'].map((who) => signIn(browser, served.address, `${who}@demo.example`)),
  )) as [Person, Person, Person]
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

const faultsOf = async (page: Page): Promise<readonly string[]> => {
  // Not as a script of the page: its content policy lets none in from elsewhere.
  await page.evaluate(engine)
  const { violations } = await page.evaluate(() =>
    (globalThis as unknown as { axe: typeof axe }).axe.run(document, {
      runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'],
    }),
  )
  return violations.map(
    ({ id, impact, help, nodes }) =>
      `${impact ?? ''} ${id}, ${nodes.length} places: ${help}: ${nodes[0]?.html.slice(0, 120) ?? ''}`,
  )
}

const looks = [
  { name: 'light', colorScheme: 'light', width: 1280 },
  { name: 'dark', colorScheme: 'dark', width: 1280 },
  { name: 'light on a phone', colorScheme: 'light', width: 390 },
] as const

const screens: readonly (readonly [who: () => Person, path: string])[] = [
  [() => consultant, '/'],
  [() => consultant, '/p/FC-241'],
  [() => consultant, '/p/FC-241/spec'],
  [() => consultant, '/p/FC-241/schedule?row=ET-1&col=required-volume'],
  [() => consultant, '/p/FC-241/trace/ET-1'],
  [() => consultant, '/p/FC-241/basis'],
  [() => consultant, '/p/FC-241/compare?a=-'],
  [() => consultant, '/p/FC-241/redlines'],
  [() => consultant, '/p/FC-241/issue'],
  [() => reviewer, '/p/FC-241/redlines'],
  [() => consultant, '/d/FC-241'],
  [() => consultant, '/help'],
  [() => consultant, '/help/verification'],
  [() => consultant, '/you'],
  ...['outbox', 'people', 'catalogue', 'title-block', 'audit'].map(
    (part) => [() => administrator, `/office?part=${part}`] as const,
  ),
]

it('has something to compare and to review', async () => {
  const { page } = consultant
  await page.goto('/p/FC-241/issue')
  await page.getByRole('textbox', { name: 'Note' }).fill('For review')
  await page.getByRole('button', { name: 'Issue for review' }).click()
  await page.getByRole('article', { name: 'First issue' }).waitFor()
})

it.each(looks)('no screen breaks a rule, $name', async ({ colorScheme, width }) => {
  const faults: string[] = []
  for (const [who, path] of screens) {
    const { page } = who()
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' })
    await page.setViewportSize({ width, height: 900 })
    await page.goto(path)
    await page.getByRole('heading', { level: 1 }).first().waitFor()
    if (path.endsWith('/spec')) await editorOf(page).waitFor()
    await page.waitForLoadState('networkidle')
    faults.push(...(await faultsOf(page)).map((fault) => `${path} ${fault}`))
  }
  expect(faults).toEqual([])
})
