import type { Finding } from './finding.ts'
import { specVersion } from './model/block.ts'
import type { SpecModel, SystemModel, Vocabulary } from './model/spec-model.ts'
import type { LineIndex } from './parse/line-index.ts'
import { parseSpec } from './parse/parse-spec.ts'
import { recall } from './parse/recent.ts'
import type { SourceMap } from './parse/source-tree.ts'
import { type Acceptance, readAcceptances } from './read/acceptance.ts'
import { readAssumptions } from './read/assumption.ts'
import { type Block, type Context, entriesOf, type Entry, entryOf, keyAt, valueAt } from './read/context.ts'
import { readFluids } from './read/fluid.ts'
import { insertKey, unknownKey } from './read/keys.ts'
import { readProject } from './read/project.ts'
import { expectBlock } from './read/shape.ts'
import { readSystem } from './read/system.ts'
import type { Report } from './report.ts'

export interface SpecReading {
  /** Null where the text is unreadable or refused, or is a spec of another version. */
  readonly model: SpecModel | null
  /** In the order of the text. */
  readonly findings: readonly Finding[]
  readonly acceptances: readonly Acceptance[]
  readonly lineIndex: LineIndex
  /** Null where the text is unreadable or refused. */
  readonly tree: SourceMap | null
}

const KEYS = ['coldfill', 'project', 'fluids', 'assumptions', 'systems']

/** Whether the text is a spec of this version. */
const readVersion = (context: Context, root: Block): boolean => {
  const entry = entryOf(root, 'coldfill')
  if (!entry) {
    const first = entriesOf(root)[0]
    context.report.add(
      'CF-S001',
      { path: '', span: first?.keySpan ?? root.span },
      {
        message: 'The spec does not say its version.',
        hint: `Begin it with \`coldfill: ${specVersion}\`.`,
        fixes: insertKey(context, root, 'coldfill', specVersion),
      },
    )
    return false
  }
  if (entry.value?.node === 'text' && entry.value.text.trim() === specVersion) return true
  context.report.add('CF-S002', valueAt(entry), {
    message:
      entry.value?.node === 'text'
        ? `\`${entry.value.text}\` is not a version of the spec that is read here.`
        : 'The version is missing.',
    hint: `Write \`coldfill: ${specVersion}\`.`,
    fixes:
      entry.value?.node === 'text'
        ? [{ title: `Write ${specVersion}`, span: entry.value.span, text: specVersion }]
        : [],
  })
  return false
}

const checkMarks = (report: Report, systems: Block): void => {
  const seen = new Map<string, Entry>()
  for (const system of entriesOf(systems)) {
    if (system.value?.node !== 'map') continue
    const vessels = entryOf({ map: system.value, path: system.path, span: system.keySpan }, 'vessels')
    if (vessels?.value?.node !== 'map') continue
    for (const vessel of entriesOf({ map: vessels.value, path: vessels.path, span: vessels.keySpan })) {
      const first = seen.get(vessel.key)
      if (first)
        report.add('CF-S060', keyAt(vessel), {
          message: `The mark \`${vessel.key}\` stands in two systems.`,
          hint: 'A mark is one vessel on the drawings. Give one of them another mark.',
          related: [{ message: `The first \`${vessel.key}\` stands here.`, path: first.path, span: first.keySpan }],
        })
      else seen.set(vessel.key, vessel)
    }
  }
  if (seen.size === 0 && report.findings.every(({ severity }) => severity !== 'error'))
    report.add(
      'CF-S062',
      { path: systems.path, span: systems.span },
      {
        message: 'The spec has no vessels yet, so there is nothing to size.',
        hint: 'Put a system with `vessels` below `systems`.',
      },
    )
}

/** Keys of the project that no size depends on. */
const NOT_SIZING = ['number', 'title', 'client', 'location', 'units', 'spec-sections'].map((key) => `project.${key}`)

/** Says of each system and vessel whether an error stands in it or in what it leans on. */
const judge = (report: Report, system: SystemModel): SystemModel => {
  const shared = report.isSound('assumptions') && report.isSound('project', ...NOT_SIZING)
  return {
    ...system,
    sound: shared && system.fluid !== null && report.isSound(system.path, `${system.path}.vessels`),
    vessels: system.vessels.map((vessel) => ({ ...vessel, sound: report.isSound(vessel.path) })),
  }
}

const readModel = (context: Context, root: Block): SpecModel => {
  for (const entry of entriesOf(root))
    if (!KEYS.includes(entry.key)) unknownKey(context, entry, { owner: 'A spec', known: KEYS })
  const project = readProject(context, entryOf(root, 'project'))
  const fluids = readFluids(context, entryOf(root, 'fluids'))
  const assumptions = readAssumptions(context, entryOf(root, 'assumptions'))
  const systemsEntry = entryOf(root, 'systems')
  const systemsBlock =
    systemsEntry && expectBlock(context, systemsEntry, 'systems: { HWS: { service: heating water } }')
  const systems = systemsBlock
    ? entriesOf(systemsBlock).flatMap((entry) => readSystem(context, entry, fluids) ?? [])
    : []
  checkMarks(context.report, systemsBlock ?? root)
  return {
    version: 1,
    project,
    fluids: Object.fromEntries([...fluids].flatMap(([id, fluid]) => (fluid ? [[id, fluid]] : []))),
    assumptions,
    systems: systems.map((system) => judge(context.report, system)),
  }
}

const inOrder = (findings: readonly Finding[]): readonly Finding[] =>
  findings.toSorted(
    (a, b) => a.range.start.line - b.range.start.line || a.range.start.character - b.range.start.character,
  )

/** Reads a spec: text, tree, typed model. Never throws; every mistake is a finding. */
export const readSpec = (text: string, vocabulary: Vocabulary): SpecReading => {
  const { report, lineIndex, tree, comments } = parseSpec(text)
  recall({ text, tree, comments, lineIndex })
  const context: Context = { text, report, vocabulary, meant: new Set() }
  const root = tree && { map: tree, path: '', span: tree.entries[0]?.keySpan ?? { start: 0, end: 0 } }
  const model = root && readVersion(context, root) ? readModel(context, root) : null
  const acceptances = tree ? readAcceptances(context, tree, comments) : []
  return { model, findings: inOrder(report.findings), acceptances, lineIndex, tree }
}
