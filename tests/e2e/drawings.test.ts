import { readFileSync } from 'node:fs'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { launchBrowser } from './browser.ts'
import { type Person, picture, signIn } from './person.ts'
import { serve, type Served } from './serve.ts'

/** The drawings of a vessel on its page: what they say, that their text is text, and their files. */
let served: Served
let browser: Browser
let consultant: Person

beforeAll(async () => {
  ;[served, browser] = await Promise.all([serve(), launchBrowser()])
  consultant = await signIn(browser, served.address, 'consultant@demo.example')
  await consultant.page.goto('/p/FC-241/trace/ET-1')
})
afterAll(async () => {
  await browser?.close()
  await served?.stop()
})

const drawing = (name: RegExp) => consultant.page.getByRole('img', { name })

it('shows pressure against height and the water in the vessel, and says both in words', async () => {
  // 50 psi is the set pressure in the spec of the clinic.
  await drawing(/^Heating water: pressure against height\. Cold .* Relief valve set at 50 psig\./u).waitFor()
  await drawing(
    /^ET-1: water in the vessel against pressure\. With the .* precharged to .* psig: cold .*, hot /u,
  ).waitFor()
  expect(
    await drawing(/water in the vessel/u)
      .locator('text')
      .allTextContents(),
  ).toContain('Relief 50')
  await picture(consultant.page, '57-drawings')
})

it.each([1280, 390])('stays within a window of %d pixels', async (width) => {
  await consultant.page.setViewportSize({ width, height: 900 })
  for (const name of [/pressure against height/u, /water in the vessel/u]) {
    await expect.poll(async () => (await drawing(name).boundingBox())?.width ?? 0).toBeLessThanOrEqual(width)
    const box = await drawing(name).boundingBox()
    const texts = await drawing(name)
      .locator('text')
      .evaluateAll((all) => all.map((text) => text.getBoundingClientRect().right))
    expect(Math.max(...texts)).toBeLessThanOrEqual((box?.x ?? 0) + (box?.width ?? 0) + 1)
  }
})

it.each(['SVG', 'PNG'] as const)('is saved as %s, in ink on white', async (format) => {
  const { page } = consultant
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: `Download ET-1: water in the vessel against pressure as ${format}` }).click(),
  ])
  expect(download.suggestedFilename()).toBe(`HWS-ET-1-water-in-the-vessel.${format.toLowerCase()}`)
  const bytes = readFileSync(await download.path())
  if (format === 'PNG') {
    expect([...bytes.subarray(1, 4)]).toEqual([...Buffer.from('PNG')])
    // Three dots for each of the 680 pixels across.
    expect(bytes.readUInt32BE(16)).toBe(3 * 680)
    return
  }
  const svg = bytes.toString('utf8')
  expect(svg).toContain('<title>ET-1: water in the vessel against pressure</title>')
  expect(svg).toContain('fill="#FFFFFF"')
  expect(svg).not.toContain('var(')
})
