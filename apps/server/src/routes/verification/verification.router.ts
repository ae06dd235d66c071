import type { Verification } from '@coldfill/contract'
import { Router } from 'express'
import { presentVerification } from './verification.presenter.ts'

/** The verification manual, run by the first who asks. */
export const verificationRouter = (): Router => {
  let kept: Verification | null = null
  return Router().get('/', (_req, res) => {
    kept ??= presentVerification()
    res.json(kept)
  })
}
