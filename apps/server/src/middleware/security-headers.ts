import { randomBytes } from 'node:crypto'
import type { RequestHandler, Response } from 'express'
import helmet from 'helmet'

/**
 * Everything comes from this server. The editor makes its style sheets at run time: they carry the nonce of the page, made anew for
 * each answer. No upgrade to https is asked for, so that an office can run the server in its own network without a certificate.
 */
export const securityHeaders = (): RequestHandler[] => [
  (_req, res, next) => {
    res.locals['nonce'] = randomBytes(16).toString('base64')
    next()
  },
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        'default-src': ["'self'"],
        'script-src': ["'self'"],
        'style-src': ["'self'", (_req, res) => `'nonce-${(res as Response).locals['nonce'] as string}'`],
        'img-src': ["'self'", 'data:'],
        'font-src': ["'self'"],
        'connect-src': ["'self'"],
        'worker-src': ["'self'"],
        'object-src': ["'none'"],
        'base-uri': ["'none'"],
        'form-action': ["'self'"],
        'frame-ancestors': ["'none'"],
      },
    },
    referrerPolicy: { policy: 'same-origin' },
    strictTransportSecurity: { maxAge: 31_536_000, includeSubDomains: false },
  }),
]
