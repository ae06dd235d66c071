/** A spec without mistakes, into which the corpus seeds one mistake each. */
export const baseSpec = `coldfill: 1
project:
  number: BR-7
  title: Bramble Row
  elevation: 5200 ft
  units: US
  codes: { plumbing: UPC 2024, mechanical: IMC 2021 }
  spec-sections: { expansion tank: 23 21 16 }
fluids:
  glycol-30: { base: propylene glycol, strength: 30 % vol }
assumptions:
  relief-margin.hydronic: { value: 10 %, reason: standard of the owner }
  material: { value: copper, reason: all piping is copper }
systems:
  HWS:
    title: Heating water
    service: heating water
    fluid: glycol-30
    temperatures: { fill: 50 °F, low: 50 °F, high: 180 °F }
    pressure:
      static-height: 42 ft
      top-margin: 4 psi
      relief-valve: 30 psi
      relief-margin: 10 %
      pump-head: 45 ft
      vessel-connection: pump suction
    contents:
      - equipment: Boilers B-1 and B-2
        volume: 24 gal
        count: 2
        material: steel
      - pipe: copper type L
        size: 2 in
        length: 640 ft
      - estimate: convectors
        output: 400 MBH
      - volume: 120 gal
        note: coils
    vessels:
      ET-1:
        kind: expansion tank
        construction: bladder
        method: ashrae
        quantity: 1
        selection: auto
      BT-1:
        kind: buffer tank
        source-minimum: 96 MBH
        load-minimum: 10 MBH
        run-time: 10 min
        temperature-band: 20 °F
  DHW:
    service: domestic hot water
    temperatures: { cold: 45 °F, storage: 140 °F }
    pressure:
      supply: 95 psi
      regulator: 60 psi
      backflow-preventer: yes
      relief-valve: 150 psi
    contents:
      - { equipment: Heater WH-1, volume: 119 gal }
    demand:
      building: apartment house
      fixtures: { lavatory: 60, shower: 30 }
    vessels:
      ST-1: { kind: storage tank, method: ashrae fixture }
      TET-1: { kind: thermal expansion tank }
  CWB:
    service: domestic cold water
    pressure: { cut-in: 40 psi, cut-out: 60 psi }
    vessels:
      PT-1: { kind: pressure tank, pump-flow: 50 gpm, starts-per-hour: 6 }
`
