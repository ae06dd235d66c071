// Facts of the trade, common practice, no source. They bound the sizes from outside: a result that leaves them is wrong
// whatever the formula says.
import { readFileSync } from 'node:fs'
import { readCatalogueFile } from '@coldfill/documents'
import { sizeSpec, type VesselResult } from '@coldfill/sizing'
import { beforeAll, describe, expect, it } from 'vitest'

const GALLON = 3.785411784e-3
let catalogue: Awaited<ReturnType<typeof readCatalogueFile>>['rows']

beforeAll(async () => {
  const read = await readCatalogueFile(readFileSync(new URL('../../examples/catalogue/vessels.csv', import.meta.url)))
  if (read.problems.length > 0) throw new Error(read.problems.map(({ message }) => message).join('\n'))
  catalogue = read.rows
})

const sized = (text: string): { vessel: VesselResult; codes: readonly string[] } => {
  const { vessels, findings } = sizeSpec(text, { catalogue })
  const [vessel] = vessels
  if (!vessel) throw new Error(findings.map(({ message }) => message).join('\n'))
  return { vessel, codes: findings.map(({ code }) => code) }
}

const gallons = (vessel: VesselResult): number => (vessel.results['required-volume']?.value ?? Number.NaN) / GALLON
const chosenGallons = (vessel: VesselResult): number => (vessel.selected?.volume ?? Number.NaN) / GALLON
const mountingOf = (vessel: VesselResult): string | undefined => vessel.selected?.mounting

const heater = (
  volume: string,
  storage = '140 °F',
  pressure = '{ supply: 50 psi, backflow-preventer: yes, relief-valve: 150 psi }',
) =>
  sized(`coldfill: 1
project: { number: C }
systems:
  D:
    service: domestic hot water
    temperatures: { cold: 50 °F, storage: ${storage} }
    pressure: ${pressure}
    contents:
      - volume: ${volume}
    vessels:
      TT: { kind: thermal expansion tank }
`)

const heating = (emitter: string, output: string) =>
  sized(`coldfill: 1
project: { number: C }
systems:
  H:
    service: heating water
    temperatures: { low: 50 °F, high: 180 °F }
    pressure: { static-height: 18 ft, relief-valve: 30 psi }
    contents:
      - estimate: ${emitter}
        output: ${output}
    vessels:
      ET: { kind: expansion tank, construction: diaphragm }
`)

describe('domestic vessels', () => {
  it('a potable tank is charged to the pressure of the incoming water', () => {
    const { vessel } = heater('50 gal')
    expect(vessel.results['precharge']?.value).toBe(vessel.results['fill-pressure']?.value)
  })

  it('a factory charge of about 40 psi has to be changed where the water comes in at another pressure', () => {
    expect(heater('50 gal', '140 °F', '{ supply: 60 psi, relief-valve: 150 psi }').codes).toContain('CF-E048')
    expect(heater('50 gal', '140 °F', '{ supply: 40 psi, relief-valve: 150 psi }').codes).not.toContain('CF-E048')
  })

  it('a 50 gal heater in a house takes one of the two smallest hung sizes, 2 to 5 gal', () => {
    const { vessel } = heater('50 gal')
    expect(gallons(vessel)).toBeLessThan(5)
    expect(chosenGallons(vessel)).toBeGreaterThanOrEqual(2)
    expect(chosenGallons(vessel)).toBeLessThanOrEqual(5)
    expect(mountingOf(vessel)).toBe('hung')
  })

  it('the same heater at 180 °F takes a larger one', () => {
    expect(gallons(heater('50 gal', '180 °F').vessel)).toBeGreaterThan(1.4 * gallons(heater('50 gal').vessel))
  })

  it('a 200 gal heater takes a tank several times larger', () => {
    expect(gallons(heater('200 gal').vessel) / gallons(heater('50 gal').vessel)).toBeGreaterThan(3)
  })

  it('floor-mounted potable tanks run to about 85 gal, and larger duties take several', () => {
    const { vessel } = heater('3000 gal')
    expect(chosenGallons(vessel)).toBeLessThanOrEqual(86)
    expect(vessel.selected?.quantity ?? 0).toBeGreaterThan(1)
  })

  it('an incoming pressure above 80 psi needs reducing first', () => {
    expect(heater('50 gal', '140 °F', '{ supply: 95 psi, relief-valve: 150 psi }').codes).toContain('CF-E051')
    expect(
      heater('50 gal', '140 °F', '{ supply: 95 psi, regulator: 60 psi, relief-valve: 150 psi }').codes,
    ).not.toContain('CF-E051')
  })
})

describe('heating vessels', () => {
  it('a factory charge of about 12 psi serves a low building', () => {
    // 18 ft of water and 4 psi at the top come to 11.8 psi.
    expect(heating('convectors', '100 MBH').codes).not.toContain('CF-E048')
  })

  it('100 MBH of finned tube takes a hung tank of a few gallons', () => {
    const { vessel } = heating('convectors', '100 MBH')
    expect(gallons(vessel)).toBeGreaterThan(1)
    expect(gallons(vessel)).toBeLessThan(8)
    expect(mountingOf(vessel)).toBe('hung')
  })

  it('1,000 MBH takes a floor-mounted one', () => {
    expect(mountingOf(heating('convectors', '1000 MBH').vessel)).toBe('floor')
  })

  it('emitters that hold more water need larger tanks at the same output', () => {
    const order = ['convectors', 'air handlers and fan coils', 'panel radiators', 'column radiators', 'underfloor']
    const sizes = order.map((emitter) => gallons(heating(emitter, '100 MBH').vessel))
    expect(sizes).toEqual(sizes.toSorted((a, b) => a - b))
    expect(new Set(sizes).size).toBe(order.length)
  })
})
