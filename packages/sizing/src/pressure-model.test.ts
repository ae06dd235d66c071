import { describe, expect, it } from 'vitest'
import { sizeSpec } from './size-spec.ts'

const PSI = 6894.757293168361

const systemWith = (pressure: string) => {
  const { systems, findings } = sizeSpec(`coldfill: 1
project: { number: P-1 }
systems:
  S:
    service: heating water
    temperatures: { low: 60 °F, high: 180 °F }
    pressure: ${pressure}
    contents:
      - volume: 300 gal
    vessels:
      ET: { kind: expansion tank, construction: diaphragm, method: ashrae }
`)
  const [system] = systems
  if (!system) throw new Error('no system')
  return { system, codes: findings.map(({ code }) => code) }
}

const psi = (value: number | undefined): number => (value ?? Number.NaN) / PSI

// Heads in feet are turned to psi by the 2.31 ft/psi of water at 60 °F that textbooks of hydronics give (46.2 ft are 20 psi).
describe('pressures of a system, pump off and on', () => {
  it('fall by 1 psi for each 2.31 ft of height', () => {
    const { system } = systemWith('{ static-height: 23.1 ft, fill: 15 psi, relief-valve: 30 psi }')
    const top = system.pressures.find(({ label }) => label === 'Highest point')
    expect(psi(top?.cold)).toBeCloseTo(5, 1)
    expect(psi(top?.hot)).toBeCloseTo(27 - 10, 1)
    expect(top?.running).toBeUndefined()
    expect(system.pump).toBeUndefined()
  })

  it('rise on the discharge side by the head where the vessel stands at the suction', () => {
    const { system } = systemWith('{ static-height: 23.1 ft, fill: 15 psi, relief-valve: 60 psi, pump-head: 46.2 ft }')
    expect(system.pump?.moves).toBe('discharge side')
    expect(psi(system.pump?.head)).toBeCloseTo(20, 1)
    // 0.9 of 60 psig when hot, and the head of the pump.
    expect(psi(system.pressures[0]?.running)).toBeCloseTo(54 + 20, 1)
  })

  it('fall on the suction side by the head where the vessel stands at the discharge', () => {
    const { system } = systemWith(
      '{ static-height: 23.1 ft, top-margin: 5 psi, relief-valve: 90 psi, pump-head: 46.2 ft, vessel-connection: pump discharge }',
    )
    expect(system.pump?.moves).toBe('suction side')
    // The fill pressure covers the height, the margin and the head: 10 + 5 + 20 psig.
    expect(psi(system.pressures[0]?.cold)).toBeCloseTo(35, 1)
    const top = system.pressures.find(({ label }) => label === 'Highest point')
    expect(psi(top?.running)).toBeCloseTo(5, 1)
  })

  it('that fall below atmosphere at the top alone are a warning, at the suction an error', () => {
    const at = (fill: string) =>
      sizeSpec(`coldfill: 1
systems:
  S:
    service: heating water
    temperatures: { low: 60 °F, high: 180 °F }
    pressure: { static-height: 23.1 ft, fill: ${fill}, relief-valve: 90 psi, pump-head: 46.2 ft, vessel-connection: pump discharge }
    contents: [{ volume: 300 gal }]
    vessels:
      ET: { kind: expansion tank, construction: diaphragm, method: ashrae }
`).findings.find(({ code }) => code === 'CF-E057')
    expect(at('35 psi')).toBeUndefined()
    expect(at('25 psi')).toMatchObject({ severity: 'warning' })
    expect(at('25 psi')?.message).toContain('highest point')
    expect(at('15 psi')).toMatchObject({ severity: 'error' })
  })
})
