import type { ProjectResult } from '@coldfill/contract'
import { describe, expect, it } from 'vitest'
import { schedules } from './schedule-table.ts'

type Vessel = ProjectResult['vessels'][number]

const GALLON = 3.785411784e-3
const vessel = (mark: string, more: Partial<Vessel>): Vessel => ({
  system: 'HWS',
  mark,
  path: `systems.HWS.vessels.${mark}`,
  kind: 'expansion tank',
  method: 'ashrae',
  methodId: 'm',
  methodTitle: 'A method',
  methodRevision: 1,
  construction: 'bladder',
  quantity: 1,
  serves: 'Heating water',
  service: 'heating water',
  fluid: 'water',
  solution: { base: 'water', massFraction: 0 },
  location: '',
  status: 'sized',
  results: {},
  trace: [],
  selected: null,
  headroom: [],
  assumptions: [],
  notes: [],
  ...more,
})
const project = (vessels: readonly Vessel[]): ProjectResult => ({
  engine: '0',
  readable: true,
  spec: 1,
  project: {
    number: 'N',
    title: 'T',
    client: '',
    location: '',
    units: 'US',
    elevation: 0,
    atmosphere: 101325,
    codes: {},
    specSections: {},
  },
  systems: [
    {
      id: 'HWS',
      title: 'Heating',
      path: 'systems.HWS',
      service: 'heating water',
      fluid: 'water',
      pressures: [],
      relief: null,
    },
  ],
  vessels,
  assumptions: [],
  findings: [],
  sources: {},
})
const volume = (gallons: number) => ({
  kind: 'volume' as const,
  value: gallons * GALLON,
  name: 'Required volume',
  entry: 'ET-1/required-volume',
})
const cell = (result: ProjectResult, row: number, key: string) => schedules(result, 'US')[0]?.rows[row]?.cells[key]

describe('the schedule on screen', () => {
  it('gives every number of a column the same decimals, enough for three digits of the smallest', () => {
    const result = project([
      vessel('ET-1', { results: { 'required-volume': volume(343.853) } }),
      vessel('ET-2', { results: { 'required-volume': volume(16.94) } }),
    ])
    expect(cell(result, 0, 'required-volume')?.text).toBe('343.9')
    expect(cell(result, 1, 'required-volume')?.text).toBe('16.9')
  })

  it('keeps the unit in the head and the trace entry behind the number', () => {
    const result = project([vessel('ET-1', { results: { 'required-volume': volume(100) } })])
    const head = schedules(result, 'SI')[0]?.columns.find((column) => column.key === 'required-volume')
    expect(head).toMatchObject({ heading: 'Required volume', unit: 'L', isResult: true })
    expect(cell(result, 0, 'required-volume')?.entry).toBe('ET-1/required-volume')
  })

  it('tells a missing input, an impossible size and what does not apply apart', () => {
    const result = project([
      vessel('ET-1', { status: 'blocked', reason: 'no relief valve.' }),
      vessel('ET-2', { status: 'infeasible', reason: 'fill above maximum.' }),
    ])
    expect(cell(result, 0, 'required-volume')?.text).toBe('?')
    expect(cell(result, 1, 'required-volume')?.text).toBe('no size')
    expect(cell(result, 1, 'precharge')?.text).toBe('—')
  })

  it('numbers equal notes once, reasons first', () => {
    const result = project([
      vessel('ET-1', { status: 'blocked', reason: 'no relief valve.', notes: ['Field verify.'] }),
      vessel('ET-2', { notes: ['Field verify.'] }),
    ])
    expect(schedules(result, 'US')[0]?.notes).toEqual(['No relief valve.', 'Field verify.'])
    expect(cell(result, 0, 'notes')?.text).toBe('1, 2')
    expect(cell(result, 1, 'notes')?.text).toBe('2')
  })

  it('shows the results of a kind that has no columns of its own', () => {
    const result = project([vessel('BT-1', { kind: 'buffer tank', results: { 'required-volume': volume(80) } })])
    expect(schedules(result, 'US')[0]?.columns.map((column) => column.key)).toContain('required-volume')
    expect(schedules(result, 'US')[0]?.title).toBe('Buffer tanks')
  })

  it('has the columns of the files but those that the page of the vessel shows, the chosen vessel behind its volume', () => {
    const selected = {
      maker: 'M',
      model: 'X',
      quantity: 1,
      volume: 0.1,
      acceptance: 0.05,
      maxPressure: 1e6,
      maxTemperature: 380,
      stamped: true,
    } as NonNullable<Vessel['selected']>
    const [table] = schedules(project([vessel('ET-1', { selected, location: 'Roof' })]), 'US')
    const keys = table?.columns.map(({ key }) => key) ?? []
    expect(keys).not.toContain('mark')
    expect(keys).not.toContain('location')
    expect(keys).not.toContain('rated-pressure')
    expect(keys.slice(keys.indexOf('required-volume'))).toEqual([
      'required-volume',
      'selected-vessel',
      'selected-volume',
      'fill-pressure',
      'precharge',
      'maximum-pressure',
      'relief-set',
      'method',
      'assumptions',
      'notes',
    ])
  })
})
