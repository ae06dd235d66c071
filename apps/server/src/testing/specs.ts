interface Choices {
  readonly number?: string
  readonly title?: string
  /** Set pressure of the relief valve of the heating loop. */
  readonly relief?: string
  readonly marks?: readonly string[]
  /** YAML put under `systems:` beside the heating loop. */
  readonly more?: string
}

const vessel = (mark: string): string => `
      ${mark}:
        kind: expansion tank
        construction: bladder
        method: ashrae`

/** A spec of one heating loop that is read without an error, with the places put in that tests change. */
export const loopSpec = ({
  number = 'T-1',
  title = 'Mill Yard',
  relief = '30 psi',
  marks = ['ET-1'],
  more = '',
}: Choices = {}): string => `coldfill: 1
project:
  number: ${number}
  title: ${title}
  client: Mill Yard Trust
  elevation: 100 ft
  units: US
  codes: { mechanical: IMC 2021 }
systems:
  HWS:
    title: Heating water
    service: heating water
    temperatures: { fill: 50 °F, low: 50 °F, high: 180 °F }
    pressure:
      static-height: 20 ft
      relief-valve: ${relief}
    contents:
      - volume: 500 gal
        note: all of it
    vessels:${marks.map(vessel).join('')}
${more}`
