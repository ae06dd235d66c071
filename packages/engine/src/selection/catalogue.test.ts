import { describe, expect, it } from 'vitest'
import { type CatalogueRow, type Requirement, selectRow } from './catalogue.ts'

const row = (model: string, volume: number, more: Partial<CatalogueRow> = {}): CatalogueRow => ({
  maker: 'Brackenfell Vessels',
  model,
  kinds: ['expansion tank'],
  construction: 'bladder',
  volume,
  acceptance: null,
  maxPressure: 8e5,
  maxTemperature: 390,
  potable: false,
  stamped: true,
  mounting: 'floor',
  diameter: null,
  height: null,
  weightEmpty: null,
  connection: null,
  line: Math.round(volume * 1000),
  ...more,
})

const need: Requirement = {
  kind: 'expansion tank',
  construction: 'bladder',
  volume: 0.1,
  acceptance: 0.03,
  pressure: 5e5,
  temperature: 360,
  potable: false,
  stamped: false,
  mounting: null,
  quantity: null,
}

describe('choosing from a catalogue', () => {
  const rows = [row('200', 0.2), row('80', 0.08), row('120', 0.12), row('100', 0.1)]

  it('takes the smallest row that is large enough and says what the next size down lacks', () => {
    const { choice, nearMiss } = selectRow(rows, need)
    expect(choice).toMatchObject({ row: { model: '100' }, quantity: 1 })
    expect(nearMiss?.row.model).toBe('80')
    expect(nearMiss?.short).toBeCloseTo(0.02, 12)
  })

  it('passes over a row that cannot take up the water, though its shell is large enough', () => {
    const { choice, nearMiss } = selectRow([row('120', 0.12, { acceptance: 0.02 }), row('200', 0.2)], need)
    expect(choice?.row.model).toBe('200')
    expect(nearMiss).toMatchObject({ row: { model: '120' }, of: 'acceptance volume' })
  })

  it.each([
    ['a pressure rating below the relief setting', { maxPressure: 4e5 }],
    ['a temperature rating below the water', { maxTemperature: 350 }],
    ['another construction', { construction: 'diaphragm' }],
    ['another kind', { kinds: ['pressure tank'] }],
  ] as const)('refuses %s', (_why, more) => {
    expect(selectRow([row('100', 0.1, more), row('200', 0.2)], need).choice?.row.model).toBe('200')
  })

  it('refuses what is not listed for drinking water, not stamped or mounted otherwise where that is asked', () => {
    for (const more of [{ potable: true }, { stamped: true }, { mounting: 'hung' }]) {
      const bare = row('100', 0.1, { stamped: false })
      expect(selectRow([bare], { ...need, ...more }).choice).toBeNull()
    }
  })

  it('takes several equal rows where one is not enough and the number is free', () => {
    expect(selectRow(rows, { ...need, volume: 0.5, acceptance: null }).choice).toMatchObject({
      row: { model: '200' },
      quantity: 3,
    })
  })

  it('keeps a fixed number, each with its share', () => {
    expect(selectRow(rows, { ...need, volume: 0.16, quantity: 2 }).choice).toMatchObject({
      row: { model: '80' },
      quantity: 2,
    })
  })

  it('reports ties', () => {
    const { ties } = selectRow([row('100', 0.1), row('100 B', 0.1)], need)
    expect(ties.map(({ model }) => model)).toEqual(['100 B'])
  })

  it('says by how much the largest falls short where nothing fits', () => {
    const { choice, nearMiss } = selectRow(rows, { ...need, volume: 0.5, quantity: 1 })
    expect(choice).toBeNull()
    expect(nearMiss?.short).toBeCloseTo(0.3, 12)
  })
})
