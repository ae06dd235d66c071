export * from './finding.ts'
export * from './model/field.ts'
export * from './model/project.ts'
export * from './model/spec-model.ts'
export * from './model/system.ts'
export * from './model/vessel.ts'
export * from './diagnostics.ts'
export * from './parse/limits.ts'
export * from './parse/line-index.ts'
export {
  type SourceEntry,
  type SourceList,
  type SourceMap,
  type SourceNode,
  type SourceText,
  isWithin,
} from './parse/source-tree.ts'
export type { Acceptance } from './read/acceptance.ts'
export * from './read-spec.ts'
export * from './spec-path.ts'
export * from './model/shape.ts'
export * from './model/spec-shape.ts'
export * from './schema.ts'
export * from './editor/completion.ts'
export * from './editor/hover.ts'
export * from './editor/accept-fix.ts'
export * from './format/format-spec.ts'
export * from './editor/edits.ts'
export type { Name, NameSort } from './editor/names.ts'
export * from './editor/uses.ts'
export * from './editor/rename.ts'
export * from './editor/outline.ts'
export * from './editor/folds.ts'
export * from './editor/mend.ts'
export * from './editor/actions.ts'
export { type SpecChange, specChanges } from './compare/spec-changes.ts'
export * from './reference/spec-reference.ts'
export * from './reference/finding-pages.ts'
export { type Merge, type MergeChange, mergeSpecs } from './merge/merge-specs.ts'
