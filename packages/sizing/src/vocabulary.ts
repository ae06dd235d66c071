import { assumptions, emitterClasses, methodNames, pipeFamilies } from '@coldfill/engine'
import { type VesselKind, vesselKindNames, vesselKinds, type Vocabulary } from '@coldfill/spec'

const methodLines = (kind: VesselKind): Record<string, string> => {
  const fields = vesselKinds[kind].fields
  const choices: Readonly<Record<string, string>> =
    'method' in fields && fields.method.field === 'choice' ? fields.method.choices : {}
  return Object.fromEntries(methodNames(kind).map((name) => [name, choices[name] ?? name]))
}

const sizedKinds = vesselKindNames.filter((kind) => methodNames(kind).length > 0)

/** The names that the spec language takes from the engine. */
export const vocabulary: Vocabulary = {
  pipes: Object.fromEntries(
    Object.entries(pipeFamilies).map(([family, { rows }]) => [
      family,
      rows.map(({ size, spellings }) => ({ size, spellings })),
    ]),
  ),
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
  buildings: [],
  fixtures: [],
}
