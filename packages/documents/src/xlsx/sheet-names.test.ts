import { describe, expect, it } from 'vitest'
import { SheetNames, tableName } from './sheet-names.ts'

describe('names of sheets', () => {
  it.each(["D'Arcy [1]: a/b\\c*?", '', 'History', 'x'.repeat(60), '=1+1', '  .. ', 'Größe', '日本'])(
    'are safe whatever a mark is called: %j',
    (wanted) => {
      const name = new SheetNames().take(wanted)
      expect(name).toMatch(/^[A-Za-z0-9(][A-Za-z0-9 .()_-]{0,30}$/)
      expect(name.toLowerCase()).not.toBe('history')
    },
  )

  it('are each given once, whatever the case', () => {
    const names = new SheetNames()
    expect([names.take('ET-1'), names.take('et-1'), names.take('ET 1')]).toEqual(['ET-1', 'et-1 (2)', 'ET 1'])
    const long = names.take('y'.repeat(40))
    const second = names.take('y'.repeat(40))
    expect(second).not.toBe(long)
    expect(second.length).toBeLessThanOrEqual(31)
  })

  it('make names of tables that are no addresses', () => {
    expect(tableName('Expansion tanks schedule')).toBe('tblExpansionTanksSchedule')
  })
})
