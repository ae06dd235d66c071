import type { ProjectResult } from '@coldfill/sizing'
import type { Kind } from '@coldfill/units'

export type VesselResult = ProjectResult['vessels'][number]
export type SystemResult = ProjectResult['systems'][number]

/** What a column may look at beside the vessel itself. */
export interface VesselContext {
  readonly vessel: VesselResult
  readonly system: SystemResult | undefined
  readonly result: ProjectResult
}

interface ColumnBase {
  /** Name of the result where the column shows one (`required-volume`), so that a redline on the cell finds it. */
  readonly key: string
  readonly heading: string
  /** Width in characters of the body type. */
  readonly width: number
  /** Left out of a schedule in which no vessel has anything for it. */
  readonly optional?: true
  /** What the chosen vessel is; every other column says what the vessel has to do and how that was found. */
  readonly part?: 'selection'
  /** The screen has it on the page of the vessel, and no column for it. */
  readonly filesOnly?: true
}

/** A column as data: words, a number of the vessel's results, or a number found elsewhere in the project. */
export type ScheduleColumnDefinition = ColumnBase &
  (
    | {
        readonly shows: 'words'
        readonly words: (context: VesselContext) => string
        readonly align?: 'left' | 'center'
      }
    | { readonly shows: 'result'; readonly kind: Kind }
    /** An input of the calculation, by the symbols it may have in the methods of this schedule. */
    | {
        readonly shows: 'input'
        readonly kind: Kind
        readonly symbols: readonly string[]
        /** SI number where the calculation does not have the input. */
        readonly otherwise?: (context: VesselContext) => number | null
      }
    /** SI number that is not part of the calculation; null where it does not apply. */
    | { readonly shows: 'quantity'; readonly kind: Kind; readonly number: (context: VesselContext) => number | null }
  )

/** A schedule of one kind of vessel. Mark stands first and the keyed notes last in every one; they are not listed here. */
export interface ScheduleDefinition {
  readonly kind: string
  readonly title: string
  readonly purpose: string
  readonly columns: readonly ScheduleColumnDefinition[]
}

export const defineSchedule = (definition: ScheduleDefinition): ScheduleDefinition => definition

export const words = (
  key: string,
  heading: string,
  width: number,
  text: (context: VesselContext) => string,
  align: 'left' | 'center' = 'left',
): ScheduleColumnDefinition => ({ shows: 'words', key, heading, width, words: text, align })

export const resultNumber = (key: string, heading: string, width: number, kind: Kind): ScheduleColumnDefinition => ({
  shows: 'result',
  key,
  heading,
  width,
  kind,
})

export const inputNumber = (
  key: string,
  heading: string,
  width: number,
  kind: Kind,
  symbols: readonly string[],
  otherwise?: (context: VesselContext) => number | null,
): ScheduleColumnDefinition => ({
  shows: 'input',
  key,
  heading,
  width,
  kind,
  symbols,
  ...(otherwise === undefined ? {} : { otherwise }),
})

export const quantity = (
  key: string,
  heading: string,
  width: number,
  kind: Kind,
  number: (context: VesselContext) => number | null,
): ScheduleColumnDefinition => ({ shows: 'quantity', key, heading, width, kind, number })

export const optional = (column: ScheduleColumnDefinition): ScheduleColumnDefinition => ({ ...column, optional: true })

export const filesOnly = (column: ScheduleColumnDefinition): ScheduleColumnDefinition => ({
  ...column,
  filesOnly: true,
})

export const ofSelection = (column: ScheduleColumnDefinition): ScheduleColumnDefinition => ({
  ...column,
  optional: true,
  part: 'selection',
})
