import express, { type Express, json, Router } from 'express'
import type { Deps } from './deps.ts'
import { notFound } from './errors.ts'
import { errorHandler, unknownAddress } from './middleware/error-handler.ts'
import { requestId } from './middleware/request-id.ts'
import { requireInsider, requireProject } from './middleware/require-project.ts'
import { requireUser } from './middleware/require-user.ts'
import { sameOriginWrites } from './middleware/same-origin-writes.ts'
import { securityHeaders } from './middleware/security-headers.ts'
import { catalogueRouter } from './routes/catalogue/catalogue.router.ts'
import { gatesRouter } from './routes/gates/gates.router.ts'
import { handoverRouter } from './routes/handover/handover.router.ts'
import { healthRouter } from './routes/health/health.router.ts'
import { officeRouter } from './routes/office/office.router.ts'
import { projectsRouter } from './routes/projects/projects.router.ts'
import { redlinesRouter } from './routes/redlines/redlines.router.ts'
import { referenceRouter, schemaRouter } from './routes/reference/reference.router.ts'
import { resultsRouter } from './routes/results/results.router.ts'
import { reviewCopyRouter } from './routes/review-copy/review-copy.router.ts'
import { revisionsRouter } from './routes/revisions/revisions.router.ts'
import { sessionRouter } from './routes/session/session.router.ts'
import { sizingRouter } from './routes/sizing/sizing.router.ts'
import { specRouter } from './routes/spec/spec.router.ts'
import { titleBlockRouter } from './routes/title-block/title-block.router.ts'
import { verificationRouter } from './routes/verification/verification.router.ts'
import { webApp } from './web-app.ts'

/** A spec of 256 kB as a JSON text, where each character may take six. The spec itself is measured again. */
const BODY_LIMIT = '1600kb'

/** What belongs to one project. Everything but the handover and the issued files is for those who consult, review or administer. */
const projectRouter = (deps: Deps): Router => {
  const inside = (router: Router): Router => Router({ mergeParams: true }).use(requireInsider).use(router)
  return Router({ mergeParams: true })
    .use(requireProject(deps))
    .use('/handover', handoverRouter(deps))
    .use('/revisions', revisionsRouter(deps))
    .use('/revisions', inside(reviewCopyRouter(deps)))
    .use('/spec', inside(specRouter(deps)))
    .use('/sizing', inside(sizingRouter(deps)))
    .use('/results', inside(resultsRouter(deps)))
    .use('/redlines', inside(redlinesRouter(deps)))
    .use('/gates', inside(gatesRouter(deps)))
}

const api = (deps: Deps): Router =>
  Router()
    .use((_req, res, next) => {
      res.set('Cache-Control', 'no-store')
      next()
    })
    .use('/health', healthRouter())
    .use(sameOriginWrites)
    .use('/session', sessionRouter(deps))
    // From here on nothing is answered, and no body read, for one who is not signed in.
    .use(requireUser(deps))
    .use('/office/catalogue', catalogueRouter(deps))
    .use('/office/title-block', titleBlockRouter(deps))
    .use(json({ limit: BODY_LIMIT }))
    .use('/reference', referenceRouter())
    .use('/verification', verificationRouter())
    .use('/office', officeRouter(deps))
    .use('/projects', projectsRouter(deps))
    .use('/projects/:project', projectRouter(deps))
    .use(unknownAddress)

/** The whole application, without listening. */
export const createApp = (deps: Deps): Express => {
  const app = express()
  app.disable('x-powered-by')
  app.set('trust proxy', deps.trustProxy)
  app.use(requestId, ...securityHeaders())
  app.use((req, _res, next) => {
    // No address has a NUL in it, and the database cannot look for one.
    if (/%00/.test(req.url)) throw notFound()
    next()
  })
  app.use('/api', api(deps))
  app.use('/schema', schemaRouter(), unknownAddress)
  app.use(webApp(deps.webFolder))
  app.use(unknownAddress)
  app.use(errorHandler(deps.log))
  return app
}
