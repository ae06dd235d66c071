/** A straight scale from numbers to places on a drawing. */
export interface Scale {
  readonly least: number
  readonly most: number
  readonly ticks: readonly number[]
  /** Place of a number. */
  at(value: number): number
}

/** Steps of 1, 2 or 5 times a power of ten, about `count` of them. */
const stepOf = (span: number, count: number): number => {
  const rough = span / count
  const power = 10 ** Math.floor(Math.log10(rough))
  return power * ([1, 2, 5].find((step) => step * power >= rough) ?? 10)
}

/** A scale over all `values` that begins and ends on a tick; `from` and `to` are places. */
export const scaleOver = (values: readonly number[], from: number, to: number, count: number): Scale => {
  const [low, high] = [Math.min(...values), Math.max(...values)]
  const step = stepOf(high > low ? high - low : Math.abs(high) || 1, count)
  const first = Math.floor(low / step + 1e-9)
  const last = Math.max(first + 1, Math.ceil(high / step - 1e-9))
  const [least, most] = [first * step, last * step]
  return {
    least,
    most,
    // The step times a whole number carries the noise of the step; a tick is printed as it should be.
    ticks: Array.from({ length: last - first + 1 }, (_, index) => Number(((first + index) * step).toPrecision(12))),
    at: (value) => from + ((value - least) / (most - least)) * (to - from),
  }
}
