import { expect, it } from 'vitest'
import { BadEnvironment, readEnv } from './env.ts'

it('has a value for everything that is not set', () => {
  expect(readEnv({ PORT: '', PATH: '/bin' })).toEqual({
    PORT: 4173,
    HOST: '127.0.0.1',
    COLDFILL_DATA: './data',
    COLDFILL_OFFICE: 'soffice',
    MAIL_FROM: 'coldfill@localhost.example',
    TRUST_PROXY: 0,
  })
})

it('names every setting that cannot be used', () => {
  expect(() => readEnv({ PORT: 'high', SMTP_URL: 'http://mail', SESSION_SECRET: 'short' })).toThrow(BadEnvironment)
  expect(() => readEnv({ PORT: 'high', SMTP_URL: 'http://mail', SESSION_SECRET: 'short' })).toThrow(
    /^PORT: .*\nSMTP_URL: .*\nSESSION_SECRET: /,
  )
})
