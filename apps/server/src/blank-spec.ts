/** A commented spec to begin with. It is read without an error and declares one vessel of a small heating loop. */
export const blankSpec = (
  number: string,
  title: string,
): string => `# yaml-language-server: $schema=https://localhost/schema/coldfill-1.json
coldfill: 1

project:
  number: ${JSON.stringify(number)}
  title: ${JSON.stringify(title)}
  # client: who it is prepared for
  elevation: 0 ft                   # height above sea level of the plant room
  units: US                         # US or SI: what schedules and documents show

systems:
  HWS:
    title: Heating water
    service: heating water
    temperatures: { fill: 50 °F, low: 50 °F, high: 180 °F }
    pressure:
      static-height: 20 ft          # highest point above the vessel connection
      relief-valve: 30 psi          # set pressure
    contents:                       # everything that holds water
      - equipment: Boiler B-1
        volume: 20 gal
      - pipe: copper type L
        size: 1 in
        length: 300 ft
    vessels:
      ET-1:
        kind: expansion tank
        construction: bladder
        method: ashrae
`
