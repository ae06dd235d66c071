import type { Citation, Origin, TraceSection } from '@coldfill/engine'
import type { Finding } from '@coldfill/spec'
import type { Kind, UnitSystem } from '@coldfill/units'

/** A number of the result. `value` is in the SI unit of the kind; documents and screens convert at the edge. */
export interface ResultValue {
  readonly kind: Kind
  readonly value: number
  /** Title for schedules: "Required volume". */
  readonly name: string
  /** Id of the trace entry that computed it. */
  readonly entry: string
}

/** `sized`; `infeasible`: no vessel can do it, the finding says why; `blocked`: an input is missing or wrong. */
export type VesselStatus = 'sized' | 'infeasible' | 'blocked'

/** The row of the office catalogue that was chosen; volumes of one vessel in m3. */
export interface SelectedVessel {
  readonly maker: string
  readonly model: string
  readonly volume: number
  readonly acceptance?: number
  /** gauge Pa */
  readonly maxPressure: number
  /** K */
  readonly maxTemperature: number
  /** m */
  readonly diameter?: number
  readonly height?: number
  /** kg */
  readonly weightEmpty?: number
  readonly connection?: string
  readonly mounting?: string
  readonly stamped: boolean
  readonly quantity: number
  /** The next size down, and by how much each vessel of it falls short, m3. Left out where the spec names the row. */
  readonly nextDown?: {
    readonly maker: string
    readonly model: string
    readonly volume: number
    readonly short: number
    readonly of: 'volume' | 'acceptance volume'
  }
  /** Other rows of the same volume that would do as well. */
  readonly ties?: readonly { readonly maker: string; readonly model: string }[]
}

/** How the required volume answers to one input, and how far the input can go with the chosen vessel. */
export interface HeadroomRow {
  readonly entry: string
  readonly symbol: string
  readonly name: string
  readonly kind: Kind
  readonly value: number
  /** Change of the required volume for one SI unit of the input, m3 per unit. */
  readonly sensitivity: number
  /** Value of the input at which the chosen vessel stops being enough; null where no value in reach does that. */
  readonly limit: number | null
}

export interface VesselResult {
  readonly system: string
  readonly mark: string
  readonly path: string
  readonly kind: string
  /** Short name as the spec has it: `ashrae`. */
  readonly method: string
  readonly methodId: string
  readonly methodTitle: string
  readonly methodRevision: number
  readonly construction?: string
  readonly quantity: number
  readonly serves: string
  readonly service: string
  readonly fluid: string
  /** The fluid in numbers, so that whoever recomputes a property need not read the label. Fractions of 1. */
  readonly solution: { readonly base: 'water' | 'propylene glycol' | 'ethylene glycol'; readonly massFraction: number }
  /** Where the vessel stands; empty where the spec does not say. */
  readonly location: string
  readonly status: VesselStatus
  /** Why an infeasible or blocked vessel has no size, one sentence. */
  readonly reason?: string
  /** By the names of command-line.md: `required-volume`, `precharge` … */
  readonly results: Readonly<Record<string, ResultValue>>
  readonly trace: readonly TraceSection[]
  readonly selected: SelectedVessel | null
  readonly headroom: readonly HeadroomRow[]
  /** Ids of the assumptions this vessel leans on, in order of number. */
  readonly assumptions: readonly string[]
  /** Free-text remarks for the keyed notes of the schedule. */
  readonly notes: readonly string[]
}

export interface UsedAssumption {
  readonly id: string
  /** A1, A2 … in order of first use; printed in schedules and on the Basis sheet. */
  readonly number: string
  readonly name: string
  /** As used here: `10 %`. */
  readonly value: string
  /** The documented default, where the spec overrides it. */
  readonly defaultValue: string
  readonly overridden: boolean
  readonly source: Citation
  readonly because: string
  /** Reason typed with an override. */
  readonly reason?: string
  /** Path of the override in the spec, or of the key that would replace the default. */
  readonly path: string
  /** `HWS/ET-1` */
  readonly usedBy: readonly string[]
}

/** One point of the pressure drawing of a system, gauge pascals at a height in metres above the vessel connection. */
export interface PressurePoint {
  readonly label: string
  readonly height: number
  readonly cold: number
  readonly hot: number
  /** Where a pump is given: the lowest on its suction side when cold, or the highest on its discharge side when hot. */
  readonly running?: number
}

export interface SystemResult {
  readonly id: string
  readonly title: string
  readonly path: string
  readonly service: string
  readonly fluid: string
  readonly pressures: readonly PressurePoint[]
  /** Relief set pressure, gauge Pa, and height of the valve above the vessel, m. */
  readonly relief: { readonly set: number; readonly height: number } | null
  /** Head in Pa, and the side whose pressure moves by it when the pump runs; the vessel keeps the other. */
  readonly pump?: { readonly head: number; readonly moves: 'suction side' | 'discharge side' }
}

export interface ProjectHeader {
  readonly number: string
  readonly title: string
  readonly client: string
  readonly location: string
  readonly units: UnitSystem
  /** m above sea level */
  readonly elevation: number
  /** Pa abs */
  readonly atmosphere: number
  readonly codes: Readonly<Record<string, string>>
  readonly specSections: Readonly<Record<string, string>>
}

/** Everything the program says about a spec: plain data, the same on every machine, frozen with a revision. */
export interface ProjectResult {
  readonly engine: string
  readonly spec: 1
  /** False where the text is no YAML, is refused, or is a spec of another version: then there is nothing but findings. */
  readonly readable: boolean
  readonly project: ProjectHeader
  readonly systems: readonly SystemResult[]
  readonly vessels: readonly VesselResult[]
  readonly assumptions: readonly UsedAssumption[]
  readonly findings: readonly Finding[]
  /** Titles of the sources cited anywhere in this result, by id. */
  readonly sources: Readonly<
    Record<string, { readonly title: string; readonly edition: string; readonly publisher: string }>
  >
}

export type { Citation, Origin, TraceSection }
