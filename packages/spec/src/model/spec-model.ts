import type { Quantity } from '@coldfill/units'
import type { Range } from '../finding.ts'
import type { Located, ReadFields } from './field.ts'
import type { projectFields } from './project.ts'
import type { pressureFields, Service, temperatureFields } from './system.ts'
import type { VesselFieldsOf, VesselKind } from './vessel.ts'

export type FluidBase = 'water' | 'propylene glycol' | 'ethylene glycol'

/** A fluid as the spec says it. Water has no strength. */
export interface FluidModel {
  readonly base: FluidBase
  readonly strength?: { readonly value: number; readonly by: 'volume' | 'mass'; readonly authored: string }
  /** Id under `fluids:` where it was named. */
  readonly id?: string
  readonly path: string
  readonly range: Range
}

interface LineBase {
  readonly path: string
  readonly range: Range
  readonly note?: string
}
/** What holds the water. `count` is 1 where not written. */
export type ContentLine = LineBase &
  (
    | {
        readonly holds: 'equipment'
        readonly name: string
        readonly volume: Located<Quantity<'volume'>>
        readonly count: number
        readonly material?: Material
      }
    | {
        readonly holds: 'pipe'
        readonly family: string
        readonly size: string
        readonly length: Located<Quantity<'length'>>
      }
    | { readonly holds: 'estimate'; readonly emitter: string; readonly output: Located<Quantity<'power'>> }
    | { readonly holds: 'volume'; readonly volume: Located<Quantity<'volume'>>; readonly material?: Material }
  )

export type Material = 'steel' | 'copper' | 'none'

export interface DemandModel {
  readonly path: string
  readonly range: Range
  readonly building?: Located<string>
  /** Fixture name → number. */
  readonly fixtures: Readonly<Record<string, Located<number>>>
  readonly people?: Located<number>
  readonly apartments?: Located<number>
}

export type SelectionModel =
  | { readonly choose: 'auto' }
  | { readonly choose: 'none' }
  | {
      readonly choose: 'row'
      readonly maker: string
      readonly model: string
      readonly path: string
      readonly range: Range
    }

export type VesselModel = {
  [K in VesselKind]: {
    readonly mark: string
    readonly path: string
    /** Range of the mark. */
    readonly range: Range
    readonly kind: K
    readonly kindRange: Range
    readonly fields: ReadFields<VesselFieldsOf<K>>
    readonly selection: SelectionModel
    /** False where a finding of severity error lies inside the vessel: it is then blocked, not sized. */
    readonly sound: boolean
  }
}[VesselKind]

export interface SystemModel {
  readonly id: string
  readonly path: string
  /** Range of the id. */
  readonly range: Range
  readonly title?: Located<string>
  readonly service?: Located<Service>
  /** Undefined where the text is silent (water); null where it says something that was not understood. */
  readonly fluid?: FluidModel | null
  readonly temperatures: ReadFields<typeof temperatureFields>
  readonly pressure: ReadFields<typeof pressureFields>
  readonly contents: readonly ContentLine[]
  readonly demand?: DemandModel
  readonly vessels: readonly VesselModel[]
  /** False where a finding of severity error lies in the system outside its vessels. */
  readonly sound: boolean
}

export interface AssumptionOverride {
  readonly id: string
  readonly path: string
  readonly range: Range
  /** As typed: `10 %`, `steel`. */
  readonly value: Located<string>
  readonly reason: Located<string>
}

/** The whole spec, read. Parts that were not understood are absent and have their finding. */
export interface SpecModel {
  readonly version: 1
  readonly project: ReadFields<typeof projectFields> & {
    readonly codes: Readonly<Record<string, Located<string>>>
    readonly specSections: Readonly<Record<string, Located<string>>>
  }
  readonly fluids: Readonly<Record<string, FluidModel>>
  readonly assumptions: readonly AssumptionOverride[]
  readonly systems: readonly SystemModel[]
}

/**
 * Names that the spec package does not own but must know to link and to complete: pipe tables, emitters, methods and assumptions
 * belong to the engine. `vocabulary` of @coldfill/sizing is the real one; the browser gets it from the server.
 */
export interface Vocabulary {
  /** Pipe family → the sizes that it has, in order, as a person writes them, with other accepted spellings. */
  readonly pipes: Readonly<Record<string, readonly { readonly size: string; readonly spellings: readonly string[] }[]>>
  /** Emitter class → one line: content per output and its range. */
  readonly emitters: Readonly<Record<string, string>>
  readonly assumptions: Readonly<
    Record<
      string,
      {
        readonly name: string
        readonly value: string
        readonly because: string
        readonly kinds: readonly string[]
        readonly choices?: readonly string[]
      }
    >
  >
  /** Vessel kind → method name → one line. A method that is not here is not offered and not accepted. */
  readonly methods: Readonly<Record<string, Readonly<Record<string, string>>>>
  /** Vessel kinds that the engine sizes. */
  readonly kinds: readonly string[]
  /** Building types and fixtures of the hot-water demand tables. */
  readonly buildings: readonly string[]
  readonly fixtures: readonly string[]
}
