import { afterEach, expect, it } from 'vitest'
import type { AppError } from './errors.ts'
import { createSizingService, type SizingService } from './sizing-service.ts'
import { loopSpec } from './testing/specs.ts'

const open: SizingService[] = []
const service = (options: Parameters<typeof createSizingService>[0] = {}): SizingService => {
  const made = createSizingService(options)
  open.push(made)
  return made
}
afterEach(async () => {
  for (const one of open.splice(0)) await one.close()
})

/** A thread that never answers the text "hang", dies of the text "die", and gives any other back, with whether it was sent a catalogue. */
const moody = new URL('./testing/moody.worker.ts', import.meta.url)

it('hands back the result with the JSON that it was read from', async () => {
  const { result, json } = await service().size(loopSpec())
  expect(JSON.parse(json)).toEqual(result)
  expect(result.vessels[0]?.status).toBe('sized')
})

it('sizes a text once and knows it the next time', async () => {
  const sizing = service()
  expect(await sizing.size(loopSpec())).toBe(await sizing.size(loopSpec()))
})

it('stops a text that takes too long, and sizes the next one', async () => {
  const sizing = service({ limit: 300, module: moody })
  const hanging = sizing.size('hang')
  const behind = sizing.size('fine')
  await expect(hanging).rejects.toMatchObject({ status: 422, code: 'sizing_too_long' })
  expect((await behind).json).toBe('"fine"')
})

it('outlives a thread that dies of a text', async () => {
  const sizing = service({ module: moody })
  const dying = sizing.size('die')
  const behind = sizing.size('fine')
  await expect(dying).rejects.toMatchObject({ status: 422, code: 'sizing_failed' })
  expect((await behind).json).toBe('"fine"')
})

it('chooses from the catalogue it is given, and keeps results of one apart from those of another', async () => {
  const sizing = service()
  const row = {
    maker: 'Wendholt',
    kinds: ['expansion tank'],
    construction: null,
    volume: 2,
    acceptance: null,
    maxPressure: 1e6,
    maxTemperature: 400,
    potable: false,
    stamped: true,
    mounting: null,
    line: 2,
  }
  const of = (model: string) => ({
    hash: model,
    rowsJson: () => Promise.resolve(JSON.stringify([{ ...row, model }])),
  })
  const chosen = async (catalogue: ReturnType<typeof of> | null) =>
    (await sizing.size(loopSpec(), catalogue)).result.vessels[0]?.selected?.model
  expect([await chosen(of('A')), await chosen(of('B')), await chosen(null), await chosen(of('A'))]).toEqual([
    'A',
    'B',
    undefined,
    'A',
  ])
})

it('sends the rows of a catalogue once to each thread', async () => {
  const sizing = service({ limit: 300, module: moody })
  const catalogue = { hash: 'A', rowsJson: () => Promise.resolve('[]') }
  const sent = async (text: string) => JSON.parse((await sizing.size(text, catalogue)).json) as unknown
  expect(await sent('one')).toEqual({ text: 'one', rowsSent: true })
  expect(await sent('two')).toEqual({ text: 'two', rowsSent: false })
  await expect(sizing.size('hang', catalogue)).rejects.toMatchObject({ status: 422 })
  expect(await sent('three')).toEqual({ text: 'three', rowsSent: true })
})

it('refuses more than 256 kB, counted in bytes', async () => {
  await expect(service().size('°'.repeat(131_073))).rejects.toMatchObject({ status: 413, code: 'spec_too_large' })
})

it('reads a hostile text of 250 kB within its limit or stops it, and goes on', async () => {
  const sizing = service()
  const keys = Array.from({ length: 19_000 }, (_, index) => `k${index}: 1`).join('\n')
  const deep = '['.repeat(120_000)
  for (const text of [keys, deep]) {
    const begun = Date.now()
    const outcome = await sizing.size(text).then(
      () => 'sized',
      (error: AppError) => error.status,
    )
    expect(['sized', 422]).toContain(outcome)
    expect(Date.now() - begun).toBeLessThan(15_000)
  }
  expect((await sizing.size(loopSpec())).result.vessels[0]?.status).toBe('sized')
})
