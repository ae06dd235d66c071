import { readFile } from 'node:fs/promises'
import { join } from 'node:path'
import express, { type RequestHandler, Router } from 'express'
import { notFound } from './errors.ts'
import { unknownAddress } from './middleware/error-handler.ts'

const NONCE = '__CSP_NONCE__'

/**
 * The built web app. Its own addresses (/p/FC-241/spec …) are all answered with index.html, in which the nonce of this answer is put
 * for the editor's style sheets.
 */
export const webApp = (folder: string): Router => {
  const send: RequestHandler = async (_req, res) => {
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
  const router = Router()
  router.use(
    '/assets',
    express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', index: false, redirect: false }),
    unknownAddress,
  )
  // Before the files of the folder: the page is never sent without its nonce.
  router.get('/index.html', send)
  router.use(express.static(folder, { index: false, redirect: false, maxAge: '1h' }))
  router.get(['/', '/*splat'], send)
  return router
}
