import { describe, expect, it } from 'vitest'
import { readSpec } from './read-spec.ts'
import { dedent, testVocabulary } from './testing.ts'

/** The example of the language reference, with the contents of the second system written out. */
const example = dedent(`
  # yaml-language-server: $schema=https://localhost/schema/coldfill-1.json
  coldfill: 1

  project:
    number: FC-241
    title: Fernhollow Community Clinic
    client: Fernhollow Health Trust
    location: Tarn Valley
    elevation: 5200 ft                # default sea level, and then an assumption
    units: US                         # US | SI: what schedules and documents show; any unit may be typed anywhere
    codes: { plumbing: UPC 2024, mechanical: IMC 2021 }   # decides which limits apply and are cited
    spec-sections: { expansion tank: 23 21 16, thermal expansion tank: 22 11 19 }   # free text, typed by the user

  fluids:
    glycol-30: { base: propylene glycol, strength: 30 % vol }     # % vol or % mass must be said

  assumptions:                        # override of any documented default, anywhere; the reason is mandatory
    relief-margin.hydronic: { value: 10 %, reason: Owner's standard, section 5.2 }

  systems:
    HWS:
      title: Heating water
      service: heating water          # heating water | chilled water | dual temperature water | condenser water | ground loop |
                                      # snow melting | solar thermal | domestic hot water | domestic cold water
      fluid: glycol-30                # default water; or inline: { base: ethylene glycol, strength: 35 % mass }
      temperatures: { fill: 50 °F, low: 50 °F, high: 180 °F }    # low/high: the coldest and hottest the water gets, shutdown included
      pressure:
        static-height: 42 ft          # highest point above the vessel connection
        top-margin: 4 psi             # positive pressure kept at the top (assumption by default)
        relief-valve: 30 psi          # set pressure
        relief-height: 0 ft           # valve above (+) or below (-) the vessel
        relief-margin: 10 %           # or a pressure; assumption by default
        pump-head: 45 ft
        vessel-connection: pump suction      # pump suction | pump discharge
        # fill: 22 psi, maximum: 27 psi      # may be given outright instead; then they are used and said to be given
      contents:                       # what holds the water
        - equipment: Boilers B-1 and B-2
          volume: 24 gal
          count: 2
          material: steel
        - pipe: copper type L         # family and type as in the pipe table
          size: 2 in                  # or DN 50
          length: 640 ft
        - estimate: convectors        # an emitter class with a documented content per output
          output: 400 MBH
        - volume: 120 gal             # anything known from elsewhere
          note: air-handler coils, from the coil schedule
      vessels:
        ET-1:
          kind: expansion tank
          construction: bladder       # diaphragm | bladder | plain steel | open
          method: ashrae              # ashrae | en 12828 | une 100155 | bs 7074 | code minimum
          material: steel             # what most of the piping is made of: steel | copper | none
          quantity: 1                 # shared equally
          selection: auto             # auto | none | { maker: …, model: … }
        BT-1:
          kind: buffer tank
          source-minimum: 96 MBH      # least output of the smallest source
          load-minimum: 10 MBH        # least load that can call alone
          run-time: 10 min
          temperature-band: 20 °F
          credit: 60 gal              # water of the circuit that always flows

    DHW:
      title: Domestic hot water
      service: domestic hot water
      temperatures: { cold: 45 °F, storage: 140 °F }
      pressure:
        supply: 95 psi                # from the street or booster
        regulator: 60 psi             # reduced pressure at the vessel; omit if none
        backflow-preventer: yes       # or check valve: closes the system
        relief-valve: 150 psi
        # maximum: 80 psi             # default: the lower of the code's fixture limit and relief less margin
      contents: [ { equipment: Water heater, volume: 119 gal } ]
      demand:
        building: apartment house
        fixtures: { lavatory: 60, bathtub: 30, shower: 30, kitchen sink: 60, laundry tub: 15 }
      vessels:
        ST-1:  { kind: storage tank, method: ashrae fixture }
        TET-1: { kind: thermal expansion tank }
    CWB:
      service: domestic cold water
      pressure: { cut-in: 40 psi, cut-out: 60 psi }
      vessels:
        PT-1: { kind: pressure tank, pump-flow: 50 gpm, starts-per-hour: 6 }     # or run-time: 2 min; or drawdown: 25 gal
`)

const read = readSpec(example, testVocabulary)
const systems = read.model?.systems ?? []
const vessel = (mark: string) => systems.flatMap(({ vessels }) => vessels).find((each) => each.mark === mark)

describe('the example of the reference', () => {
  it('reads without errors and warnings', () => {
    expect(read.findings.filter(({ severity }) => severity !== 'note')).toEqual([])
  })

  it('notes the comma in an unquoted text in braces and reads the whole text', () => {
    expect(read.findings.map(({ code }) => code)).toEqual(['CF-Y024'])
    expect(read.model?.assumptions[0]?.reason.value).toBe("Owner's standard, section 5.2")
  })

  it('gives every system and vessel sound', () => {
    expect(systems.map(({ id, sound }) => [id, sound])).toEqual([
      ['HWS', true],
      ['DHW', true],
      ['CWB', true],
    ])
    expect(systems.flatMap(({ vessels }) => vessels.map(({ mark, kind, sound }) => [mark, kind, sound]))).toEqual([
      ['ET-1', 'expansion tank', true],
      ['BT-1', 'buffer tank', true],
      ['ST-1', 'storage tank', true],
      ['TET-1', 'thermal expansion tank', true],
      ['PT-1', 'pressure tank', true],
    ])
  })

  it('reads the project', () => {
    const project = read.model?.project
    expect(project?.number?.value).toBe('FC-241')
    expect(project?.units?.value).toBe('US')
    expect(project?.elevation?.value).toEqual({
      kind: 'length',
      value: expect.closeTo(1584.96, 6),
      authored: '5200 ft',
    })
    expect(project?.codes['plumbing']?.value).toBe('UPC 2024')
    expect(project?.specSections['thermal expansion tank']?.value).toBe('22 11 19')
  })

  it('links the fluid to its definition', () => {
    expect(systems[0]?.fluid).toMatchObject({
      base: 'propylene glycol',
      strength: { value: 0.3, by: 'volume' },
      id: 'glycol-30',
      path: 'fluids.glycol-30',
    })
    expect(systems[1]?.fluid).toBeUndefined()
  })

  it('reads each line of contents', () => {
    expect(systems[0]?.contents).toMatchObject([
      { holds: 'equipment', name: 'Boilers B-1 and B-2', count: 2, material: 'steel', path: 'systems.HWS.contents.0' },
      { holds: 'pipe', family: 'copper type L', size: '2 in', length: { value: { authored: '640 ft' } } },
      { holds: 'estimate', emitter: 'convectors', output: { value: { kind: 'power' } } },
      { holds: 'volume', note: 'air-handler coils, from the coil schedule' },
    ])
  })

  it('reads readings with their kinds and places', () => {
    expect(systems[0]?.temperatures.high).toMatchObject({
      value: { kind: 'temperature', authored: '180 °F' },
      path: 'systems.HWS.temperatures.high',
    })
    expect(systems[0]?.pressure['relief-margin']?.value).toMatchObject({ kind: 'ratio', value: 0.1 })
    expect(systems[1]?.pressure['backflow-preventer']?.value).toBe(true)
  })

  it('reads fields of vessels and what is to be selected', () => {
    const tank = vessel('ET-1')
    expect(tank?.kind === 'expansion tank' && tank.fields.construction?.value).toBe('bladder')
    expect(tank?.selection).toEqual({ choose: 'auto' })
    const pressureTank = vessel('PT-1')
    expect(pressureTank?.kind === 'pressure tank' && pressureTank.fields['starts-per-hour']?.value).toBe(6)
  })

  it('reads the demand', () => {
    expect(systems[1]?.demand?.building?.value).toBe('apartment house')
    expect(systems[1]?.demand?.fixtures['kitchen sink']?.value).toBe(60)
  })
})
