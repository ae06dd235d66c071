import { contentKinds } from './contents.ts'
import { demandFields } from './demand.ts'
import { blockDocs, overrideFields, selectedRowFields } from './block.ts'
import { fluidFields } from './fluid.ts'
import { codeFields, projectFields } from './project.ts'
import { pressureFields, systemFields, temperatureFields } from './system.ts'
import { vesselKinds } from './vessel.ts'

const tables: readonly object[] = [
  blockDocs,
  overrideFields,
  selectedRowFields,
  fluidFields,
  projectFields,
  codeFields,
  systemFields,
  temperatureFields,
  pressureFields,
  demandFields,
  ...Object.values(contentKinds).map(({ fields }) => fields),
  ...Object.values(vesselKinds).map(({ fields }) => fields),
]

const keys = new Set(tables.flatMap((table) => Object.keys(table)))

/** Whether any block of the language has a key of this name. */
export const isKeyOfLanguage = (word: string): boolean => keys.has(word)
