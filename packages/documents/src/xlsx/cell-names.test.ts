import { expect, it } from 'vitest'
import { cellName } from './cell-names.ts'

it.each([
  [['ET-1', 'precharge'], 'ET_1_precharge'],
  [['1-ÉT', 'fill-pressure'], '_1_ET_fill_pressure'],
  [['A1', ''], '_A1'],
  [['R1C1'], '_R1C1'],
  [['=cmd|', "'x"], 'cmd_x'],
])('names a cell after %j', (parts, name) => {
  expect(cellName(...parts)).toBe(name)
})
