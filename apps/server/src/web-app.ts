import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import express, { Router } from 'express'
import { notFound } from './errors.ts'

const NONCE = '__CSP_NONCE__'

/**
 * The built web app. Its own addresses (/p/FC-241/spec …) are all answered with index.html, in which the nonce of this answer is put
 * for the editor's style sheets.
 */
export const webApp = (folder: string): Router => {
  const router = Router()
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', index: false, redirect: false }),
  )
  router.use(express.static(folder, { index: false, redirect: false, maxAge: '1h' }))
  router.get('/*splat', async (req, res) => {
    // A missing file is missing; only addresses of the app itself fall through to it.
    if (/\.[a-z0-9]+$/i.test(req.path) && !req.accepts('html')) throw notFound()
    await send(res)
  })
  router.get('/', async (_req, res) => {
    await send(res)
  })
  const send = async (res: express.Response): Promise<void> => {
    let page: string
    try {
      page = await readFile(join(folder, 'index.html'), 'utf8')
    } catch {
      throw notFound()
    }
    res
      .set('Cache-Control', 'no-store')
      .type('html')
      .send(page.replaceAll(NONCE, String(res.locals['nonce'])))
  }
  return router
}
