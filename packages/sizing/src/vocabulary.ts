import {
  assumptions,
  demandBuildings,
  emitterClasses,
  fixtureAliases,
  fixtureDemandRows,
  methodNames,
  pipeFamilies,
  pipeFamilyAliases,
} from '@coldfill/engine'
import { type VesselKind, vesselKindNames, vesselKinds, type Vocabulary } from '@coldfill/spec'

const methodLines = (kind: VesselKind): Record<string, string> => {
  const fields = vesselKinds[kind].fields
  const choices: Readonly<Record<string, string>> =
    'method' in fields && fields.method.field === 'choice' ? fields.method.choices : {}
  return Object.fromEntries(methodNames(kind).map((name) => [name, choices[name] ?? name]))
}

const sizedKinds = vesselKindNames.filter((kind) => methodNames(kind).length > 0)

const sizesOf = (family: string) => {
  const found = pipeFamilies[family]
  if (!found) throw new Error(`no pipe family ${family}`)
  return found.rows.map(({ size, spellings }) => ({ size, spellings }))
}

/** The names that the spec language takes from the engine. */
export const vocabulary: Vocabulary = {
  pipes: Object.fromEntries([
    ...Object.keys(pipeFamilies).map((family) => [family, sizesOf(family)]),
    ...Object.entries(pipeFamilyAliases).map(([alias, family]) => [alias, sizesOf(family)]),
  ]),
  emitters: Object.fromEntries(
    Object.entries(emitterClasses).map(([name, emitter]) => [name, `${emitter.value}. ${emitter.because}`]),
  ),
  assumptions: Object.fromEntries(
    Object.values(assumptions).map(({ id, name, value, because, kind, alsoKind, choices }) => [
      id,
      { name, value, because, kinds: alsoKind ? [kind, alsoKind] : [kind], ...(choices ? { choices } : {}) },
    ]),
  ),
  methods: Object.fromEntries(sizedKinds.map((kind) => [kind, methodLines(kind)])),
  kinds: sizedKinds,
  buildings: demandBuildings,
  fixtures: [...Object.keys(fixtureAliases), ...Object.keys(fixtureDemandRows)],
}
