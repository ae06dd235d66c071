import { assumptions, type Assumption, type GivenValue } from '@coldfill/engine'
import type { SpecModel } from '@coldfill/spec'
import { type Kind, parseQuantity } from '@coldfill/units'
import type { UsedAssumption } from './result.ts'

interface Use {
  readonly assumption: Assumption
  readonly value: string
  readonly override: SpecModel['assumptions'][number] | undefined
  /** In order; a vessel's uses come one after the other. */
  readonly usedBy: string[]
  /** Read once from the text of the value; undefined until asked for. */
  number?: AssumedNumber | undefined
}

/** A number that an assumption stands in for, with the kind in which it was given. */
export interface AssumedNumber extends GivenValue {
  readonly kind: Kind
}

const numberOf = (assumption: Assumption, text: string): AssumedNumber | null => {
  if (assumption.kind === 'words') throw new Error(`assumption ${assumption.id} is a choice, not a number`)
  const kinds: readonly Kind[] = assumption.alsoKind ? [assumption.kind, assumption.alsoKind] : [assumption.kind]
  const parsed = parseQuantity(text, kinds)
  if (!parsed.ok) return null
  const { kind, value } = parsed.quantity
  return { kind, value, authored: text, origin: { from: 'assumption', id: assumption.id } }
}

/**
 * Hands out documented defaults, or what the spec puts in their place, and remembers which vessel leaned on which.
 * Numbers A1, A2 … are given in order of first use.
 */
export class AssumptionRegister {
  private readonly overrides: ReadonlyMap<string, SpecModel['assumptions'][number]>
  private readonly uses = new Map<string, Use>()
  /** Vessels are sized one after the other; what the present one leaned on. */
  private present = { vessel: '', ids: new Set<string>() }

  constructor(overrides: SpecModel['assumptions']) {
    this.overrides = new Map(overrides.map((override) => [override.id, override]))
  }

  private use(id: string, vessel: string): Use {
    let use = this.uses.get(id)
    if (!use) {
      const assumption = assumptions[id]
      if (!assumption) throw new Error(`no assumption ${id}`)
      let override = this.overrides.get(id)
      // An override that cannot be read has its finding already; the documented default stands in.
      if (override && assumption.kind === 'words' && !assumption.choices?.includes(override.value.value))
        override = undefined
      if (override && assumption.kind !== 'words' && !numberOf(assumption, override.value.value)) override = undefined
      use = { assumption, override, value: override?.value.value ?? assumption.value, usedBy: [] }
      this.uses.set(id, use)
    }
    if (use.usedBy.at(-1) !== vessel) use.usedBy.push(vessel)
    if (this.present.vessel !== vessel) this.present = { vessel, ids: new Set() }
    this.present.ids.add(id)
    return use
  }

  /** The number assumed, in SI units of its kind. */
  number(id: string, vessel: string): AssumedNumber {
    const use = this.use(id, vessel)
    use.number ??= numberOf(use.assumption, use.value) ?? undefined
    if (!use.number) throw new Error(`assumption ${id} has a value that is no quantity: ${use.value}`)
    return use.number
  }

  /** The number that would be assumed, without counting it as used. */
  peek(id: string): number {
    const assumption = assumptions[id]
    if (!assumption) throw new Error(`no assumption ${id}`)
    const override = this.overrides.get(id)
    const number = (override && numberOf(assumption, override.value.value)) ?? numberOf(assumption, assumption.value)
    if (!number) throw new Error(`assumption ${id} has a value that is no quantity`)
    return number.value
  }

  /** The choice assumed. */
  words(id: string, vessel: string): string {
    return this.use(id, vessel).value
  }

  /** Ids that the vessel sized last leaned on, in order of number. */
  usedBy(vessel: string): readonly string[] {
    const { present } = this
    return present.vessel === vessel ? [...this.uses.keys()].filter((id) => present.ids.has(id)) : []
  }

  list(): readonly UsedAssumption[] {
    return [...this.uses.values()].map(({ assumption, override, value, usedBy }, index) => {
      const { id, name, source, because } = assumption
      const used = {
        id,
        number: `A${index + 1}`,
        name,
        value,
        defaultValue: assumption.value,
        overridden: override !== undefined,
        source,
        because,
        path: override?.path ?? assumption.overriddenBy,
        usedBy,
      }
      return override ? { ...used, reason: override.reason.value } : used
    })
  }
}
