import { describe, expect, it } from 'vitest'
import { baseSpec } from '../corpus/base-spec.ts'
import { textIn } from '../spec-path.ts'
import { foldsOf } from './folds.ts'
import { type OutlineItem, outlineOf } from './outline.ts'

const drawn = (item: OutlineItem, depth = 0): string[] => [
  `${'  '.repeat(depth)}${item.sort} ${item.name}${item.detail ? ` (${item.detail})` : ''}`,
  ...item.children.flatMap((child) => drawn(child, depth + 1)),
]

const outline = (text: string): OutlineItem => {
  const found = outlineOf(text)
  if (!found) throw new Error('no outline')
  return found
}

describe('outline', () => {
  it('is the building, its fluids and systems, and their vessels', () => {
    expect(drawn(outline(baseSpec))).toEqual([
      'building BR-7 (Bramble Row)',
      '  fluid glycol-30 (propylene glycol, 30 % vol)',
      '  system HWS (Heating water)',
      '    vessel ET-1 (expansion tank)',
      '    vessel BT-1 (buffer tank)',
      '  system DHW (domestic hot water)',
      '    vessel ST-1 (storage tank)',
      '    vessel TET-1 (thermal expansion tank)',
      '  system CWB (domestic cold water)',
      '    vessel PT-1 (pressure tank)',
    ])
  })

  it('gives the name and what belongs to it', () => {
    const vessel = outline(baseSpec).children[1]?.children[0]
    if (!vessel) throw new Error('no vessel')
    expect(textIn(baseSpec, vessel.range)).toBe('ET-1')
    expect(textIn(baseSpec, vessel.extent)).toMatch(/^ET-1:\n[\s\S]*selection: auto$/u)
    expect(vessel.path).toBe('systems.HWS.vessels.ET-1')
  })

  it('is drawn of a text with mistakes', () => {
    const broken = baseSpec.replace('title: Bramble Row', 'title: "Bramble Row" x')
    expect(drawn(outline(broken)).filter((line) => line.includes('vessel'))).toHaveLength(5)
    expect(drawn(outline('coldfill: 1\n'))).toEqual(['building '])
    expect(outlineOf('\u0000')).toBeNull()
  })
})

describe('folding', () => {
  const folds = foldsOf(`# one\n# two\n# three\n${baseSpec}`).map(
    ({ start, end, sort, level, path }) => `${start}-${end} ${sort} ${level} ${path}`,
  )

  it('takes runs of comments and every block of more than one line', () => {
    expect(folds[0]).toBe('0-2 comment 0 ')
    expect(folds).toContain('4-10 block 1 project')
    expect(folds).toContain('17-53 block 2 systems.HWS')
    expect(folds).toContain('42-47 block 4 systems.HWS.vessels.ET-1')
    expect(folds).toContain('30-33 block 4 systems.HWS.contents.0')
  })

  it('leaves alone what stands on one line', () => {
    expect(folds.join()).not.toContain('temperatures')
  })

  it('never ends before it begins, and folds of one line begin once', () => {
    const all = foldsOf(baseSpec)
    expect(all.every(({ start, end }) => end > start)).toBe(true)
    expect(new Set(all.map(({ start }) => start)).size).toBe(all.length)
  })
})
