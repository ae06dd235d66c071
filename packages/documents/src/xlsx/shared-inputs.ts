import type { InputLine } from '../calculation/vessel-calculation.ts'
import { sheetReference } from './put-cell.ts'

interface InputCell {
  readonly sheet: string
  readonly address: string
  readonly si: number
}

/**
 * The one cell of each key of the spec: where several calculations use the same key, the first holds the number and the
 * others refer to it, so that a change reaches every vessel.
 */
export class SharedInputs {
  readonly #cells = new Map<string, InputCell>()

  /** The cell that already holds this input, with the formula text that refers to it from a sheet. */
  find(line: InputLine): { from: (sheet: string) => string } | undefined {
    const cell = line.key === null ? undefined : this.#cells.get(line.key)
    // One key may feed two different numbers, as a length that is halved: those stay apart.
    if (!cell || cell.si !== line.si) return undefined
    return { from: (sheet) => (sheet === cell.sheet ? cell.address : `${sheetReference(cell.sheet)}!${cell.address}`) }
  }

  add(line: InputLine, sheet: string, address: string): void {
    if (line.key !== null && !this.#cells.has(line.key)) this.#cells.set(line.key, { sheet, address, si: line.si })
  }
}
