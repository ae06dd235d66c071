import type { Health } from '@coldfill/contract'
import { engineVersion } from '@coldfill/sizing'
import { Router } from 'express'

export const healthRouter = (): Router =>
  Router().get('/', (_req, res) => {
    res.json({ ok: true, engine: engineVersion } satisfies Health)
  })
