/** One row of the fluid properties on a calculation sheet. The formula holds for the SI unit beside it. */
export interface PropertyRow {
  readonly symbol: string
  readonly name: string
  readonly unit: string
  readonly source: string
  /** Formula text over the cells of other rows at the same argument. */
  readonly formula: (at: (symbol: string) => string) => string
  /** Shown until a program recalculates; from the values of other rows at the same argument. */
  readonly value: (of: (symbol: string) => number) => number
}

/** What a property is worked out from: the argument that a formula gives, and the rows that lead from it to the property. */
export interface PropertyLaw {
  /** Symbol of the row of the property. */
  readonly property: string
  readonly argument: {
    readonly symbol: string
    readonly name: string
    readonly unit: string
    /** SI units in the unit of the row. */
    readonly scale: number
    /** SI range in which the property holds. Outside it the sheet says #N/A, as the engine has no value there. */
    readonly least: number
    readonly most: number
  }
  readonly rows: readonly PropertyRow[]
}

/** `text` where it lies in the range, else #N/A. */
export const within = (text: string, least: number, most: number): string =>
  `IF(AND(${text}>=${least},${text}<=${most}),${text},NA())`
