import type { Browser } from 'playwright-core'
import { afterAll, afterEach, beforeAll, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { editorOf, overwriteSpec, type Person, picture, signIn, typedText } from './person.ts'
import { serve, type Served } from './serve.ts'

/** What goes wrong in a text is said beside it; the text stays, and so does the server. */
let served: Served
let browser: Browser
let person: Person

const findings = () => person.page.getByRole('tabpanel', { name: /^Findings/u })

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  person = await signIn(browser, served.address, 'consultant@demo.example')
  await person.page.goto('/p/FC-241/spec')
  await editorOf(person.page).waitFor()
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})
afterEach(async () => {
  const health = await fetch(`${served.address}/api/health`)
  if (health.status !== 200) throw new Error(`the server answers ${health.status}`)
})

it('broken YAML has a finding with its line, and keeps the last results', async () => {
  const { page } = person
  const text = 'coldfill: 1\nproject: { number: "FC-241\nsystems:\n'
  await overwriteSpec(page, text)
  await findings()
    .getByText(/^Line [234]\b/u)
    .first()
    .waitFor()
  await picture(page, '40-broken')
  expect(
    await findings()
      .getByText(/CF-Y\d{3}/u)
      .count(),
  ).toBeGreaterThan(0)
  expect(await typedText(person.page)).toContain('number: "FC-241')
  // The results of the last text that could be read stay in sight.
  expect(await page.getByText(/Cannot be sized; results of|sizing…/iu).count()).toBeGreaterThan(0)
})

it('a bomb of aliases is refused with a finding', async () => {
  const levels = Array.from({ length: 12 }, (_, n) =>
    n === 0
      ? 'a0: &a0 [x, x, x, x, x, x, x, x, x]'
      : `a${n}: &a${n} [${Array<string>(9)
          .fill(`*a${n - 1}`)
          .join(', ')}]`,
  )
  await overwriteSpec(person.page, `coldfill: 1\n${levels.join('\n')}\n`)
  await findings()
    .getByText(/CF-Y\d{3}/u)
    .first()
    .waitFor()
  await picture(person.page, '41-bomb')
  expect(await typedText(person.page)).toContain('a11: &a11')
})

it('unknown keys, wrong units and impossible pressures are named at their lines', async () => {
  await overwriteSpec(
    person.page,
    `coldfill: 1
project: { number: FC-241, title: Fernhollow Community Clinic }
systems:
  HWS:
    service: heating water
    temperatures: { low: 50 °F, high: 180 gal }
    pressure: { static-height: 42 ft, releif-valve: 30 psi, relief-valve: 12 psi }
    contents: [{ volume: 200 gal }]
    vessels: { ET-1: { kind: expansion tank, material: steel } }
  CHW:
    service: chilled water
    temperatures: { low: 42 °F, high: 90 °F }
    pressure: { static-height: 42 ft, relief-valve: 12 psi }
    contents: [{ volume: 200 gal }]
    vessels: { ET-2: { kind: expansion tank, material: steel } }
`,
  )
  const list = findings()
  await list
    .getByText(/^Line 6/u)
    .first()
    .waitFor()
  await list
    .getByText(/^Line 7.*releif-valve/u)
    .first()
    .waitFor()
  await list.getByRole('link', { name: /CF-E020/u }).waitFor()
  await picture(person.page, '42-findings')
  await person.page.getByRole('tab', { name: /^Results/u }).click()
  const results = person.page.getByRole('tabpanel', { name: /^Results/u })
  await expect.poll(() => results.textContent()).toContain('no vessel can do it')
  expect(await results.textContent()).toContain('not sized')
  await person.page.getByRole('tab', { name: /^Findings/u }).click()
})

it('a text above the limit is refused when it is saved, and nothing of it is lost', async () => {
  const { page } = person
  await overwriteSpec(
    page,
    `coldfill: 1\n# the last line says where this ends\n${'# 0123456789 0123456789 0123456789\n'.repeat(9000)}# the end of 300 kB\n`,
  )
  await page.getByRole('button', { name: 'Save', exact: true }).click()
  await expect.poll(() => page.getByRole('alert').or(page.getByText(/256/u)).count()).toBeGreaterThan(0)
  await picture(page, '43-too-large')
  expect(await typedText(person.page)).toContain('# the end of 300 kB')
  const saved = (await (await page.request.get('/api/projects/FC-241/spec')).json()) as {
    text: string
    version: number
  }
  expect(saved.version).toBe(1)
  expect(saved.text).toContain('Fernhollow Community Clinic')
})

it('5 MB, or a body that is no JSON, is refused by the server and not read', async () => {
  const { page } = person
  const write = { 'Content-Type': 'application/json', 'X-Requested-With': 'coldfill', Origin: served.address }
  const huge = await page.request.post('/api/projects/FC-241/sizing', {
    headers: write,
    data: JSON.stringify({ text: 'x'.repeat(5_000_000) }),
  })
  expect(huge.status()).toBe(413)
  expect(huge.headers()['content-type']).toContain('application/problem+json')
  const broken = await page.request.post('/api/projects/FC-241/sizing', { headers: write, data: '{"text": ' })
  expect(broken.status()).toBe(400)
})

it('the text is still there after all of it, on the next visit', async () => {
  const { page } = person
  await page.reload()
  await editorOf(page).waitFor()
  await page.getByText('A text that was not saved is kept on this device').first().waitFor()
  expect(await typedText(person.page)).toContain('Fernhollow Community Clinic')
  await page.getByRole('button', { name: 'Take it up' }).first().click()
  expect(await typedText(page)).toContain('# the end of 300 kB')
  expect(person.complaints).toEqual([])
})
