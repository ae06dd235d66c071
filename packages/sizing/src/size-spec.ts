import type { CatalogueRow } from '@coldfill/engine'
import { readSpec } from '@coldfill/spec'
import { engineVersion } from './engine-version.ts'
import { inReadingOrder } from './collect-findings.ts'
import type { ProjectResult } from './result.ts'
import { sizeProject } from './size-project.ts'
import { vocabulary } from './vocabulary.ts'

export interface SizingOptions {
  /** Rows of the office catalogue, from which vessels are chosen. */
  readonly catalogue?: readonly CatalogueRow[]
}

const nothing = (findings: ProjectResult['findings']): ProjectResult => ({
  engine: engineVersion,
  spec: 1,
  readable: false,
  project: {
    number: '',
    title: '',
    client: '',
    location: '',
    units: 'US',
    elevation: 0,
    atmosphere: 101325,
    codes: {},
    specSections: {},
  },
  systems: [],
  vessels: [],
  assumptions: [],
  findings,
  sources: {},
})

/** Reads a spec and sizes its vessels. For any text there is a result; what is wrong with the text is among its findings. */
export const sizeSpec = (text: string, options: SizingOptions = {}): ProjectResult => {
  const { model, findings, acceptances } = readSpec(text, vocabulary)
  return model ? sizeProject(model, findings, acceptances, options.catalogue) : nothing(inReadingOrder(findings))
}
