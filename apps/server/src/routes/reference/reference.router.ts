import { vocabulary } from '@coldfill/sizing'
import { jsonSchema } from '@coldfill/spec'
import { Router } from 'express'
import { presentReference } from './reference.presenter.ts'

export const referenceRouter = (): Router => {
  const reference = presentReference()
  return Router().get('/', (_req, res) => {
    res.json(reference)
  })
}

/** The schema of the spec for editors elsewhere: open to all, from any site. */
export const schemaRouter = (): Router => {
  const schema = JSON.stringify(jsonSchema(vocabulary), null, 2)
  return Router().get('/coldfill-1.json', (_req, res) => {
    res
      .set({
        'Access-Control-Allow-Origin': '*',
        'Cross-Origin-Resource-Policy': 'cross-origin',
        'Cache-Control': 'public, max-age=3600',
      })
      .type('application/schema+json')
      .send(schema)
  })
}
