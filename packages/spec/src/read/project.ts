import type { Fields, Located } from '../model/field.ts'
import { codeFields, projectFields, specSectionField } from '../model/project.ts'
import type { SpecModel } from '../model/spec-model.ts'
import { vesselKindNames } from '../model/vessel.ts'
import { type Context, type Entry, entryOf } from './context.ts'
import { readFields } from './field.ts'
import { expectBlock } from './shape.ts'

const specSectionFields: Fields = Object.fromEntries(vesselKindNames.map((kind) => [kind, specSectionField]))

const written = <T>(read: Readonly<Record<string, Located<T> | undefined>>): Record<string, Located<T>> =>
  Object.fromEntries(Object.entries(read).flatMap(([key, value]) => (value ? [[key, value]] : [])))

export const readProject = (context: Context, entry: Entry | undefined): SpecModel['project'] => {
  const block = entry && expectBlock(context, entry, 'project: { number: FC-241, title: Fernhollow Community Clinic }')
  if (!block) return { codes: {}, specSections: {} }
  const read = readFields(context, block, projectFields, {
    owner: '`project`',
    others: ['codes', 'spec-sections'],
  })
  const codesEntry = entryOf(block, 'codes')
  const codes = codesEntry && expectBlock(context, codesEntry, 'codes: { plumbing: UPC 2024, mechanical: IMC 2021 }')
  const sectionsEntry = entryOf(block, 'spec-sections')
  const sections = sectionsEntry && expectBlock(context, sectionsEntry, 'spec-sections: { expansion tank: 23 21 16 }')
  return {
    ...read,
    codes: codes ? written(readFields(context, codes, codeFields, { owner: '`codes`' })) : {},
    specSections: sections
      ? written(
          readFields(context, sections, specSectionFields, { owner: '`spec-sections`' }) as Record<
            string,
            Located<string>
          >,
        )
      : {},
  }
}
