import { water } from '@coldfill/engine'
import { describe, expect, it } from 'vitest'
import { fileName } from './file-name.ts'
import { clinicProject } from './testing/index.ts'

const project = clinicProject(water.functions)
const named = (number: string) => ({ ...project, project: { ...project.project, number } })

describe('the name of a file', () => {
  it('says project, revision and kind', () => {
    expect(fileName(project, 'B', 'schedule')).toBe('FC-241-rev-B-schedule.xlsx')
    expect(fileName(project, '', 'submittal')).toBe('FC-241-submittal.docx')
    expect(fileName(project, '', 'pdf')).toBe('FC-241-submittal.pdf')
  })

  it('holds nothing that a file system, a header or an address could read otherwise', () => {
    for (const number of ['../../etc/passwd', 'a"b\r\nc', 'Größe 12', '', '..', 'con:|<>?*']) {
      expect(fileName(named(number), 'A', 'schedule')).toMatch(/^[A-Za-z0-9]+(-[A-Za-z0-9]+)*\.xlsx$/)
    }
  })
})
