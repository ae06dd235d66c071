import { chmodSync, mkdtempSync, readdirSync, rmSync, statSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { OfficeFailure, openOffice } from './office.ts'

let folder: string
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'coldfill-command-'))
})
afterAll(() => rmSync(folder, { recursive: true }))

/** A command that answers when asked for its version; `lines` are what it does with a file. */
const command = (name: string, lines: string): string => {
  const path = join(folder, name)
  writeFileSync(path, `#!/bin/sh\n[ "$1" = --version ] && exit 0\n${lines}\n`)
  chmodSync(path, 0o755)
  return path
}
const left = (): string[] => readdirSync(tmpdir()).filter((name) => name.startsWith('coldfill-pages-'))

it('is null where the command is not there, or does not answer as it should', async () => {
  expect(await openOffice(join(folder, 'nowhere'))).toBeNull()
  writeFileSync(join(folder, 'no'), '#!/bin/sh\nexit 3\n', { mode: 0o755 })
  expect(await openOffice(join(folder, 'no'))).toBeNull()
})

describe.skipIf(process.platform === 'win32')('printing', () => {
  it('fails in words where no file comes out, and leaves nothing behind', async () => {
    const before = left()
    const office = await openOffice(command('idle', 'exit 0'))
    await expect(office?.print(new Uint8Array())).rejects.toThrow(OfficeFailure)
    expect(left()).toEqual(before)
  })

  it('ends what the command started when its time is over, or when it is called off', async () => {
    const beat = join(folder, 'beat')
    const beats = (): number => statSync(beat, { throwIfNoEntry: false })?.size ?? 0
    const started = () => expect.poll(beats, { timeout: 5_000 }).toBeGreaterThan(0)
    const stopped = async (): Promise<void> => {
      await expect
        .poll(async () => {
          const before = beats()
          await new Promise((resolve) => setTimeout(resolve, 500))
          return beats() - before
        })
        .toBe(0)
      rmSync(beat)
    }
    // As the command of LibreOffice: a script around a process that works.
    const hanging = command('hanging', `(while :; do echo beat >> '${beat}'; sleep 0.1; done) &\nwait`)
    const late = await openOffice(hanging, 1_500)
    await expect(late?.print(new Uint8Array())).rejects.toThrow('LibreOffice took longer than 1.5 s.')
    await started()
    await stopped()

    const calledOff = new AbortController()
    const printing = (await openOffice(hanging))?.print(new Uint8Array(), calledOff.signal)
    await started()
    calledOff.abort(new Error('enough'))
    await expect(printing).rejects.toThrow('enough')
    await stopped()
  })
})
