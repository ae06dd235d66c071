import { existsSync } from 'node:fs'
import { type Browser, chromium } from 'playwright-core'
import { unpackChromium } from './unpack-chromium.ts'

const installed = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/usr/bin/google-chrome-stable',
]

const switches = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-dev-shm-usage',
  '--disable-quic',
  '--disable-background-networking',
  '--no-first-run',
]

const inherited = (): Record<string, string> =>
  Object.fromEntries(Object.entries(process.env).filter((pair): pair is [string, string] => pair[1] !== undefined))

/** The Chromium that comes through npm, whatever the machine has. */
export const launchUnpacked = async (cache?: string): Promise<Browser> => {
  const { executable, environment } = await unpackChromium(cache)
  return chromium.launch({
    executablePath: executable,
    args: [...switches, '--headless=shell', '--no-zygote'],
    env: { ...inherited(), ...environment },
  })
}

/** A Chromium: CHROMIUM_PATH, an installed one, or else the one that comes through npm. */
export const launchBrowser = async (): Promise<Browser> => {
  const wanted = process.env['CHROMIUM_PATH']
  if (wanted !== undefined && wanted !== '' && !existsSync(wanted))
    throw new Error(`CHROMIUM_PATH is ${wanted}, which is not there.`)
  const found = wanted !== undefined && wanted !== '' ? wanted : installed.find((path) => existsSync(path))
  return found === undefined ? launchUnpacked() : chromium.launch({ executablePath: found, args: switches })
}
