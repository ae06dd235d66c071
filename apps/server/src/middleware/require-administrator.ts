import type { RequestHandler } from 'express'
import { notFound } from '../errors.ts'
import { principalIn } from './require-user.ts'

/** Stops all but the administrator of the office: for them there is nothing here. */
export const requireAdministrator: RequestHandler = (_req, res, next) => {
  if (!principalIn(res).administrator) throw notFound()
  next()
}
