import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe, expect, it } from 'vitest'
import { launchUnpacked } from './browser.ts'

describe.runIf(process.platform === 'linux' && process.arch === 'x64')('the Chromium that comes through npm', () => {
  it('is unpacked once, starts, draws text and takes a click', async () => {
    const cache = await mkdtemp(join(tmpdir(), 'coldfill-chromium-'))
    try {
      for (let run = 0; run < 2; run++) {
        const browser = await launchUnpacked(cache)
        try {
          const page = await browser.newPage()
          await page.setContent(
            '<meta charset="utf-8"><p style="display:inline">140 °F</p><button onclick="this.textContent=`done`">go</button>',
          )
          await page.getByRole('button', { name: 'go' }).click()
          expect(await page.getByRole('button').textContent()).toBe('done')
          const box = await page.locator('p').boundingBox()
          expect(box?.width ?? 0).toBeGreaterThan(30)
          expect((await page.screenshot()).length).toBeGreaterThan(1000)
        } finally {
          await browser.close()
        }
      }
    } finally {
      await rm(cache, { recursive: true, force: true })
    }
  })
})
