import { water } from '@coldfill/engine'
import { sizeSpec } from '@coldfill/sizing'
import { describe, expect, it } from 'vitest'
import { clinicProject, everyVessel } from '../testing/index.ts'
import { headerText, scheduleKinds, scheduleTable } from '@coldfill/presentation'

const project = clinicProject(water.functions)
const row = (kind: string, mark: string, units: 'US' | 'SI' = 'US') =>
  scheduleTable(project, kind, units).rows.find((candidate) => candidate.mark === mark)

describe('a schedule', () => {
  it('has one table a kind, Mark first and the keyed notes last', () => {
    expect(scheduleKinds(project)).toEqual(['expansion tank', 'thermal expansion tank'])
    for (const kind of scheduleKinds(project)) {
      const keys = scheduleTable(project, kind, 'US').columns.map((column) => column.key)
      expect(keys.at(0)).toBe('mark')
      expect(keys.at(-1)).toBe('notes')
      expect(new Set(keys).size).toBe(keys.length)
    }
  })

  it('says the unit in the heading and keeps headings unique', () => {
    const headings = (units: 'US' | 'SI') => scheduleTable(project, 'expansion tank', units).columns.map(headerText)
    expect(headings('US')).toContain('Precharge (psig)')
    expect(headings('SI')).toContain('Precharge (kPa)')
    expect(headings('SI')).toContain('Required volume (L)')
    expect(new Set(headings('US')).size).toBe(headings('US').length)
  })

  it('shows each number in the unit of its column, with the id of the trace entry behind it', () => {
    // Given as 180 °F and 45 psi in the project; 180 °F is 82.22 °C by definition of the scales.
    expect(row('expansion tank', 'ET-1')?.cells['high-temperature']).toEqual({
      text: '180',
      value: 180,
      entry: 'ET-1/highest-water-temperature',
    })
    expect(row('expansion tank', 'ET-1', 'SI')?.cells['high-temperature']?.value).toBeCloseTo(82.2222, 4)
    expect(row('expansion tank', 'ET-1')?.cells['relief-set']?.value).toBe(45)
  })

  it('marks a missing input with ?, an impossible vessel with "no size", and gives the reason as a keyed note', () => {
    const blocked = row('thermal expansion tank', 'TET-2')
    expect(blocked?.cells['required-volume']).toEqual({ text: '?', value: null, entry: null })
    const infeasible = row('expansion tank', 'ET-2')
    expect(infeasible?.cells['required-volume']?.text).toBe('no size')
    const { notes } = scheduleTable(project, 'expansion tank', 'US')
    const number = infeasible?.cells['notes']?.text
    expect(notes.find((note) => String(note.number) === number)?.text).toContain('no vessel is large enough')
  })

  it('numbers a note once, however many vessels have it', () => {
    const vessels = project.vessels.map((vessel) => ({ ...vessel, kind: 'expansion tank' }))
    const { notes } = scheduleTable({ ...project, vessels }, 'expansion tank', 'US')
    const texts = notes.map((note) => note.text)
    expect(new Set(texts).size).toBe(texts.length)
    expect(notes.map((note) => note.number)).toEqual(notes.map((_, index) => index + 1))
  })

  it('leaves a column out in which no vessel has a number', () => {
    const keys = (kind: string) => scheduleTable(project, kind, 'US').columns.map((column) => column.key)
    expect(keys('expansion tank')).not.toContain('selected-volume')
    expect(keys('thermal expansion tank')).toContain('selected-volume')
  })

  it('prints a kind that has no columns of its own from its results', () => {
    const vessels = project.vessels.map((vessel) => ({ ...vessel, kind: 'drain-back tank' }))
    const table = scheduleTable({ ...project, vessels }, 'drain-back tank', 'SI')
    expect(table.title).toBe('Drain-back tanks')
    expect(table.columns.map(headerText)).toContain('Required volume (L)')
    expect(table.rows).toHaveLength(4)
  })

  it('is plain data: nothing is lost on the way through JSON', () => {
    const table = scheduleTable(project, 'expansion tank', 'US')
    expect(JSON.parse(JSON.stringify(table))).toEqual(table)
  })

  it('has headings that are told apart in every kind, in both units', () => {
    const every = sizeSpec(everyVessel)
    for (const units of ['US', 'SI'] as const)
      for (const kind of scheduleKinds(every)) {
        const headings = scheduleTable(every, kind, units).columns.map(headerText)
        expect({ kind, twice: headings.filter((heading, at) => headings.indexOf(heading) !== at) }).toEqual({
          kind,
          twice: [],
        })
      }
  })

  it('says what a vessel of a kind without columns of its own is sized from', () => {
    const every = sizeSpec(everyVessel)
    const row = scheduleTable(every, 'pressure tank', 'US').rows.find(({ mark }) => mark === 'PT-5')
    // As typed: 50 gpm and six starts an hour.
    expect([row?.cells['pump-flow']?.text, row?.cells['starts-per-hour']?.text]).toEqual(['50', '6'])
  })
})
